# extremes with the gases that attain them, and how the limits stand
printf '[limit wobbe-gross]\nmin = 47\nmax = 52\n[limit relative-density]\nmax = 0.9\n[range methane]\nmin = 80\n[range ethane]\nmax = 11\n[range nitrogen]\nmax = 7\n' >window.ini
bluecone contract window.ini --worst g20
bluecone contract window.ini --worst g20 --json | sed -n '/"worst"/,/^  \],/p' | sed -n 1,40p
