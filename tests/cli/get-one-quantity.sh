# One quantity of a bundled gas: value and unit, the state aside.
bluecone get wobbe-gross g20
