# Units of the trade; each quantity takes the first that fits.
bluecone get hhv,hhv-mole,hhv-mass,density --unit kWh/m3,kcal/mol,Btu/lb,lb/ft3 --quiet pipeline-h
bluecone get wobbe-gross --unit kcal/m3 --quiet pipeline-h
bluecone get hhv --unit therm/m3 --quiet pipeline-h
bluecone get hhv --at 60F/60F --unit Btu/scf --quiet pipeline-h
bluecone get hhv --at 25/0 --unit kWh/Nm3 --quiet pipeline-h
