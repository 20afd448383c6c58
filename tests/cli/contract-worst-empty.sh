# ranges and limits that exclude every gas are named
printf '[limit wobbe-gross]\nmin = 56\n[range methane]\nmin = 80\n[range ethane]\nmax = 1\n[range propane]\nmax = 2\n[range c4+]\nmax = 1\n' >none.ini
bluecone contract none.ini --worst; echo $?
