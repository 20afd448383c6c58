# Water of the gas counts: metered saturated, or in the composition.
bluecone burn --saturated --excess 10 g20 | sed -n '/^State/,/^Gas/p; /^Oxidant/,/^$/p; /Water dew/p; /^Flue gas comp/,/^$/p'
bluecone burn --excess 10 methane=94.3,water=5.7 | sed -n '/^Oxidant/,/^$/p; /Water dew/p; /^Flue gas comp/,/^$/p; /^Warnings/,/^$/p'
