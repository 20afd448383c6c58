# Names of the trade, uncertainties, bases and the rest.
bluecone get hhv --quiet CH4=92,C2H6=5,N2=3
bluecone get hhv --quiet methane=92,ethane=5,nitrogen=rest
bluecone get hhv --quiet C1=96,C2=2,iC4=1,nC4=1
bluecone get hhv --quiet "volume:methane=92,ethane=5,nitrogen=3"
bluecone get hhv --quiet "mass:methane=86,ethane=9,nitrogen=5"
bluecone get hhv --quiet "mole:methane=92,ethane=5,nitrogen=3"
bluecone get hhv --quiet propane=58,air=42
bluecone get hhv "methane=98,c6+=2"
bluecone get hhv --csv "methane=92~0.3,ethane=5~0.1,nitrogen=3"
