#!/bin/bash
# Opens pages in a headless Chromium and workbooks with openpyxl: more_pages.sh PYTHON WORK_FOLDER
# A page must load without a message on the console, be no wider than a telephone of 360 px, and have the
# contrast of WCAG AA in every text; a workbook must hold the figures of --json.
set -euo pipefail
python=$1
work=$2/pages
mkdir -p "$work"
cd "$work"
browser=$(command -v chromium || command -v chromium-browser || true)
if [ -z "$browser" ]; then
    echo "more_pages: no chromium, which 'make deps-cross' installs"
    exit 1
fi

printf '[gas]\nname = </title><script>document.body.innerHTML="broken"</script>\n[components]\nmethane = 97.3\nethane = 2.7\n' >hostile.ini
examples=$SRC/examples
bluecone sheet --quiet -o sheet.html g20
bluecone sheet -o four.html "$examples/present-supply.ini" "$examples/new-supply-offer.ini" hydrogen-blend-20 biogas
bluecone burn --working --excess 15 -o burn.html "$examples/new-supply-offer.ini"
bluecone burn --lambda 0.93 -o rich.html hostile.ini
bluecone verify -o verify.html
bluecone list species -o list.html
bluecone blend 0..30/5 hydrogen rest pipeline-h --within "$examples/contract-marrowfen.ini" -o blend.html
bluecone switch "$examples/present-supply.ini" "$examples/new-supply-offer.ini" -o switch.html
bluecone get hhv,wobbe-gross -o get.html hostile.ini g20

chromium() {
    "$browser" --headless --no-sandbox --disable-gpu --hide-scrollbars --user-data-dir="$work/profile" \
        --allow-file-access-from-files --enable-logging=stderr "$@" 2>>console.txt
}

failed=0
pages='sheet four burn rich verify list get blend switch'
complain() {
    echo "more_pages: $*"
    failed=1
}
for page in $pages; do
    : >console.txt
    sed "s/PAGE/$page.html/" "$SRC/tests/crosscheck/look_at_page.html" >"look.html"
    chromium --virtual-time-budget=20000 --dump-dom "file://$work/look.html" >dom.txt
    verdict=$(sed -n 's/.*<p id="verdict">\([^<]*\)<.*/\1/p' dom.txt)
    [ "$verdict" = fine ] || complain "$page.html: ${verdict:-nothing came back}"
    chromium --screenshot="$page.png" --window-size=1200,2000 "file://$work/$page.html" >/dev/null
    [ "$(head -c 4 "$page.png" | od -An -c | tr -d ' ')" = '211PNG' ] || complain "$page.html: no screenshot"
    if grep CONSOLE console.txt; then complain "$page.html: messages on the console"; fi
    "$browser" --headless --no-sandbox --disable-gpu --user-data-dir="$work/profile" --no-pdf-header-footer \
        --print-to-pdf="$page.pdf" "file://$work/$page.html" 2>/dev/null
    [ "$(head -c 5 "$page.pdf")" = '%PDF-' ] || complain "$page.html: cannot be printed"
done
echo "$(echo "$pages" | wc -w) pages opened, photographed and printed by $("$browser" --version 2>/dev/null)"

compare() {
    bluecone "$@" --quiet -o book.xlsx && bluecone "$@" --quiet --json >book.json
    "$python" "$SRC/tests/crosscheck/compare_workbook.py" book.xlsx book.json "${*//$examples\//}" || failed=1
}
compare sheet g20
compare sheet "$examples/present-supply.ini" "$examples/new-supply-offer.ini" hydrogen-blend-20 biogas
compare burn --excess 15 --working --sweep excess=0..50 "$examples/new-supply-offer.ini"
compare verify en437
compare blend 0..30/5 hydrogen rest pipeline-h --within "$examples/contract-marrowfen.ini"
compare switch --blend-in "$examples/present-supply.ini" "$examples/new-supply-offer.ini"
compare get hhv,wobbe-gross,z g20 hydrogen
exit $failed
