# One area of the published check values.
bluecone verify steam
