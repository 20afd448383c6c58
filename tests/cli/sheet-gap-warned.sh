# Hydrogen cyanide: the two routes part, and the sheet names who is to blame.
bluecone sheet hydrogen-cyanide=60,methane=40 | sed -n '/^Checks/,$p'
bluecone get formation-gap hydrogen-cyanide=60,methane=40
