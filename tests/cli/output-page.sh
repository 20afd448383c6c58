# A page of HTML and a workbook: nothing on standard output, charts where the command has them, the
# verdict with its word, a hostile name shown as text.
printf '[gas]\nname = </title><script>alert(1)</script>\n[components]\nmethane = 97.3\nethane = 2.7\n' >hostile.ini
bluecone sheet --quiet -o sheet.html hostile.ini g20
grep -c '<script' sheet.html
grep -o '<dt>Gas A</dt>.*' sheet.html
bluecone burn --quiet -o burn.HTML g20 && grep -c '<svg ' burn.HTML
bluecone burn --quiet --lambda 0.93 -o rich.html g20 && grep -o '<p class="verdict.*' rich.html
bluecone verify --quiet -o verify.html en437 && grep -o '<p class="verdict.*' verify.html
bluecone get --quiet hhv,wobbe-gross -o get.html g20 && grep -c '<tr><th scope="row"' get.html
bluecone list methods -o list.html && head -n 1 list.html
bluecone burn --quiet -o burn.xlsx g20
bluecone burn --quiet -o again.xlsx g20 && cmp burn.xlsx again.xlsx && echo the same
python3 - <<'P'
import re, zipfile
book = zipfile.ZipFile("burn.xlsx")
print(book.testzip(), len([n for n in book.namelist() if n.startswith("xl/charts/")]), "charts")
for name in re.findall(r'<sheet name="([^"]*)"', book.read("xl/workbook.xml").decode()):
    print(name)
P
# Where nothing can be written: exit 4.
bluecone sheet --quiet -o no/such/folder/page.html g20
echo "exit $?"
bluecone sheet --quiet -o no/such/folder/book.xlsx g20
echo "exit $?"
