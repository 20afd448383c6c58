printf '[contract]\nname = Ours\n[limit wobe-gross]\nmin = 4\n' >contract.ini
bluecone blend 50 g20 50 g25 --within contract.ini
