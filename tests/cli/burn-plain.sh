# A gas with nothing stated: stoichiometric dry air, 25 C, flue gas at 150 C.
bluecone burn g20
