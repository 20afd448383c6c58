# Metered saturated with water vapour, as in a wet displacement meter.
bluecone get hhv,wobbe-gross,molar-mass pipeline-h
bluecone get hhv,wobbe-gross,molar-mass --saturated pipeline-h
