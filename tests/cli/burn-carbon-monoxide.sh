# Carbon monoxide: no water, no dew point, and no burning velocity that depends on the gas alone.
bluecone burn --excess 9 carbon-monoxide=100
