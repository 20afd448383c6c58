# a limit that is no ratio of linear sums cannot bind the worst gas, which is told
printf '[limit mcp]\nmax = 40\n[limit hhv]\nmax = 42\n[limit ethane]\nmax = 9\nbasis = mass\n[range methane]\nmin = 80\n' >mcp.ini
bluecone contract mcp.ini --worst methane=90,ethane=6,propane=4 --digits 6 | sed -n '/^What a gas/,$p'
