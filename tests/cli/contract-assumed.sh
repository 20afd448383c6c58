# a unit and a state that the contract leaves open are taken, and told; what states them, or has none, is not
printf '[limit h2s]\nmax = 5\n[limit wobbe-gross]\nmin = 45\n[limit methane-number]\nmin = 65\nat = 15/15\n[limit hhv]\nat = 25/0\nmin = 9.5\nunit = kWh/m3\n' >open.ini
bluecone contract open.ini | sed -n '/^Warnings/,$p'
printf '[contract]\nat = 25/0\n[limit wobbe-gross]\nmin = 45\nunit = MJ/m3\n' >stated.ini
bluecone contract stated.ini | grep -c 'states no'
# a file that follows one with a state has that
printf '[contract]\nfollows = stated.ini\n[limit hhv]\nmin = 35\nunit = MJ/m3\n' >follows.ini
bluecone contract follows.ini | grep -c 'states no'
