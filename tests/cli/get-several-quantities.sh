# A list of quantities, one a line, in the order asked for.
bluecone get hhv,lhv,relative-density,z,molar-mass g25
