# Another reference state: volumes and heats per volume follow, the flame does not.
bluecone burn --at 25/0 --edition 1995 --excess 11 --rate 250Nm3/h pipeline-h | sed -n '/^State/,/^Gas/p; /^Adiabatic/,/^$/p; /^Flue gas, complete/,/leaves/p; /Heat given/p; /^Rates/,/^$/p'
bluecone burn --at 60F/60F@14.73psi --excess 11 --rate 9000scf/h --unit Btu/scf,MMBtu/h pipeline-h | sed -n '/^State/,/^Gas/p; /Heat given/p; /^Rates/,/^$/p'
