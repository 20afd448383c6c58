# the limits of a contract stand on its page and in its workbook, before all else; those of a blend where it has them
cp -r "$SRC/examples" .
words() { sed -e 's/<[^>]*>/ /g' -e 's/  */ /g' -e 's/ \(\.[0-9]\)/\1/g' -e 's/^ //; s/ $//' "$1"; }
bluecone contract examples/contract-marrowfen.ini examples/new-supply-offer.ini g25 --quiet -o page.html; echo "exit $?"
words page.html | sed -n '/^limit gas/,/^Heat/p'
bluecone contract gb-gsmr-2025 --quiet -o alone.html; words alone.html | sed -n '/^limit unit/,/^About/p'
bluecone blend 85 g20 15 hydrogen --within gb-gsmr-2025 --quiet -o blend.html; words blend.html | sed -n '/^limit gas/,/^Comp/p'
bluecone contract examples/contract-marrowfen.ini examples/new-supply-offer.ini --quiet -o book.xlsx
python3 - <<'P'
import re, zipfile
book = zipfile.ZipFile("book.xlsx")
print(re.findall(r'<sheet name="([^"]*)"', book.read("xl/workbook.xml").decode())[:3])
print(len(re.findall("<row", book.read("xl/worksheets/sheet2.xml").decode())), "rows")
P
