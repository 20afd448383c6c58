# Sixty Fahrenheit is shown as such, with the contract pressure.
bluecone sheet --at 60F/60F@14.73psi --unit Btu/scf,Btu/lb,lb/ft3 methane=94.9,ethane=2.5,propane=0.2,nitrogen=1.6,carbon-dioxide=0.7,n-butane=0.1
