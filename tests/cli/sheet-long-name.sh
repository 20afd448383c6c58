# A literal is its own name: its head in the table is broken.
bluecone sheet methane=94.9,ethane=2.5,propane=0.2,nitrogen=1.6,carbon-dioxide=0.7,n-butane=0.1 g20 | sed -n "/^Composition/,/^$/p"
