# A sum off 100 is told, and in a sheet also what the missing share would mean.
bluecone get hhv,wobbe-gross methane=91.2,ethane=5,nitrogen=3
bluecone sheet methane=91.2,ethane=5,nitrogen=3 | sed -n '/missing/,/^$/p' 
