# A warm gas: shown for burners in general, counted on a burner.
bluecone switch g20 g21 --fuel-temp 60C | sed -n "/^Old gas and/,/^Flame/p; /^Warnings/,/^$/p; /^Verdict/,/^Caution/p"
printf "[burner]\ntype = nozzle-mix\ncontrol = fixed\n[air]\nexcess = 15\n" >b.ini
bluecone switch g20 g21 --fuel-temp 60C --burner b.ini | sed -n "/^Criteria/,/^Checks/p; /^Verdict/,/^Caution/p"
