# Temperatures without a column in the standard: computed, and labelled.
bluecone get hhv,z --at 18/25 pipeline-h
