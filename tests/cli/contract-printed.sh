# printed figures of one state, of none, exchanged, and of a page that changes its basis
cp -r "$SRC/examples" .
bluecone contract en437-2h examples/present-supply.ini --quiet --printed hhv=38.382MJ/Nm3,wobbe-gross=49.19MJ/Nm3 | sed -n '/^Which/,/^Verdict/p'
bluecone contract en437-2h examples/present-supply.ini --quiet --printed hhv=52.1MJ/m3 | sed -n '/^Which/,/^Verdict/p'
bluecone contract en437-2h examples/present-supply.ini --quiet --printed hhv=41.21MJ/m3,wobbe-gross=50.05MJ/m3 | sed -n '/^Which/,/^Verdict/p'
