# a limit on an index of two gases takes the present supply
printf '[limit wobbe-ratio]\nmin = 0.95\nmax = 1.05\n[limit mcp]\nmin = 35\nmax = 47\n[limit propane]\nmax = 5\nbasis = mass\n' >indices.ini
bluecone contract indices.ini pipeline-h --against g20 --quiet | sed -n '/^Limits/,/^$/p; /^Verdict/,$p'
