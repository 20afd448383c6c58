# two gases, one of them outside; the specification is superseded
bluecone contract gb-gsmr-1996 pipeline-h biomethane
