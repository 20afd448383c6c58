# The edition a contract of old names; the unknown one is refused.
bluecone get hhv,wobbe-gross,z --edition 1995 pipeline-h
bluecone get hhv,wobbe-gross,z --edition 2016 pipeline-h
bluecone get hhv --edition 1983 pipeline-h
