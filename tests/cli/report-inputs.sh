# A report that is kept names the files it was made from, as sha256sum does: the gases, the contract with the ones it
# follows, the burner, the oxidant.
cp "$SRC/examples/present-supply.ini" "$SRC/examples/new-supply-offer.ini" "$SRC/examples/kiln.ini" .
printf '[contract]\nfollows = en437-2h\n[limit hydrogen]\nmax = 2\n' >house.ini
printf '[components]\noxygen = 28\nnitrogen = 72\n' >rich-air.ini
inputs() { python3 -c 'import json, sys; [print(i["sha256"][:16], i["name"]) for i in json.load(sys.stdin)["inputs"]]'; }
bluecone switch --burner kiln.ini present-supply.ini new-supply-offer.ini --json | inputs
bluecone contract house.ini g20 --json | inputs
bluecone burn present-supply.ini --oxidant rich-air.ini --json | inputs
bluecone blend 20 g20 rest present-supply.ini --within house.ini --json | inputs
for file in kiln.ini house.ini rich-air.ini "$SRC/compositions/g20.ini"; do sha256sum <"$file" | cut -c 1-16; done
# on the page and in the workbook, not in the text; a gas written on the command line has no file
bluecone contract house.ini g20 -o page.html --quiet
grep -o '<dt>Files.*' page.html | grep -o '<bdi>[^<]*</bdi>'
bluecone contract house.ini g20 -o book.xlsx --quiet
unzip -p book.xlsx xl/sharedStrings.xml | grep -o '[^<>]*SHA-256 ................'
bluecone contract house.ini g20 | grep -c SHA
bluecone get hhv methane=100 --json | grep -c inputs || true
