#!/bin/bash
# The figures of our own source beside their targets: measured | target, as in section 9 of the style
# guide. To read, not to game. Wants $SRC, $OUT (built) and $COMPILE (the compiler with its flags).
set -euo pipefail
cd "$SRC"

work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT
mapfile -t sources < <(find src -name '*.c' | LC_ALL=C sort)
mapfile -t code < <(find src include -name '*.[ch]' | LC_ALL=C sort)
mapfile -t headers < <(find include -name '*.h' | LC_ALL=C sort)

row() { printf '%-58s | %-22s | %s\n' "$1" "$2" "$3"; }

# at PERCENT: that percentile of the numbers on stdin (100 is the largest).
at() { sort -n | awk -v p="$1" '{ v[NR] = $1 } END { i = int(NR * p / 100 + 0.999); print NR ? v[i < 1 ? 1 : i] : "-" }'; }
# spread FILE PERCENT...: several percentiles, with " / " between.
spread() {
    local file=$1 text=
    shift
    for p; do text="$text / $(at "$p" <"$file")"; done
    echo "${text# / }"
}
percent() { awk -v a="$1" -v b="$2" 'BEGIN { print b ? sprintf("%.0f %%", 100 * a / b) : "-" }'; }

# Functions: file, name, first line, last line, parameters, static or not.
ctags --languages=C --langmap=C:.c --kinds-C=f --fields=+neSf -o - "${sources[@]}" | awk -F '\t' '!/^!/ {
    line = end = 0; signature = "()"; linkage = "extern"
    for (i = 4; i <= NF; i++) {
        if ($i ~ /^line:/) line = substr($i, 6)
        if ($i ~ /^end:/) end = substr($i, 5)
        if ($i ~ /^signature:/) signature = substr($i, 11)
        if ($i == "file:") linkage = "static"
    }
    parameters = signature == "()" || signature == "(void)" ? 0 : gsub(/,/, ",", signature) + 1
    if (end) print $2, $1, line, end, parameters, linkage
}' >"$work/functions"

# Lines of every file: file, line, has code, has a comment, depth of braces at its deepest.
awk '
FNR == 1 { comment = depth = 0 }
{
    text = $0; has_code = has_comment = 0; deepest = depth
    while (text != "") {
        if (comment) {
            has_comment = 1
            end = index(text, "*/")
            if (!end) break
            comment = 0; text = substr(text, end + 2)
        } else if (match(text, /^[ \t]+/)) text = substr(text, RLENGTH + 1)
        else if (substr(text, 1, 2) == "/*") { comment = has_comment = 1; text = substr(text, 3) }
        else if (substr(text, 1, 2) == "//") { has_comment = 1; break }
        else {
            has_code = 1
            if (match(text, /^"([^"\\]|\\.)*"/) || match(text, /^\047([^\047\\]|\\.)*\047/)) {
                text = substr(text, RLENGTH + 1); continue
            }
            c = substr(text, 1, 1)
            if (c == "{" && ++depth > deepest) deepest = depth
            if (c == "}") depth--
            text = substr(text, 2)
        }
    }
    print FILENAME, FNR, has_code, has_comment, deepest
}' "${code[@]}" >"$work/lines"

# The same inside functions: deepest braces of each, and comment lines per 100 code lines.
awk -v depths="$work/depths" '
FNR == NR { for (l = $3; l <= $4; l++) inside[$1, l] = $2; next }
($1, $2) in inside {
    f = $1 " " inside[$1, $2]
    if ($5 > deepest[f]) deepest[f] = $5
    code += $3; comments += $4
}
END { for (f in deepest) print deepest[f] >depths; print code ? sprintf("%.0f", 100 * comments / code) : "-" }
' "$work/functions" "$work/lines" >"$work/in_bodies"

awk '{ print $4 - $3 + 1 }' "$work/functions" >"$work/length"
awk '{ print $5 }' "$work/functions" >"$work/parameters"
pmccabe "${sources[@]}" | awk '{ print $2 }' >"$work/mccabe"
wc -l "${sources[@]}" | awk '$2 != "total" { print $1 }' >"$work/file"
for file in "${sources[@]}"; do
    eval "$COMPILE -MM \"\$file\"" | grep -oE '[^ ]+\.h' | wc -l || true
done >"$work/seen"

sh tests/house/edges.sh | grep -v '\.def$' >"$work/edges" || true
# depth FILE...: the longest chain of project headers below each.
depth() {
    printf '%s\n' "$@" | awk '
    FNR == NR { to[$1] = to[$1] " " $2; next }
    function below(file, n, i, d, most, list) {
        if (file in known) return known[file]
        n = split(to[file], list, " "); most = 0
        for (i = 1; i <= n; i++) if ((d = 1 + below(list[i])) > most) most = d
        return known[file] = most
    }
    { print below($1) }' "$work/edges" -
}

# Prototypes in public headers, and whether a comment stands over them or over their group, which
# ends at the next blank line.
awk '
FNR == 1 || /^[ \t]*$/ { comment = 0 }
/\*\// { comment = 1 }
/^[ \t]*BC_API/ { total++; if (comment) explained++; else print "not explained: " FILENAME ":" FNR >"/dev/stderr" }
END { print total + 0, explained + 0 }' "${headers[@]}" >"$work/api"
read -r api explained <"$work/api"

rows=$(find src -name '*.def' -exec grep -hE '^[A-Z][A-Z0-9_]*\(' {} + | wc -l)
sourced=$(find src -name '*.def' -exec grep -hE '^[A-Z][A-Z0-9_]*\(.*"[^"]+"\)[[:blank:]]*(/\*.*)?$' {} + | wc -l)
checks=$(find src/data -name 'checks*.def' -exec grep -hE '^[A-Z][A-Z0-9_]*\(' {} + | wc -l)
examples=$({ grep -rhsE '^(\.Dl )?\$ ' README.md man examples || true; } | wc -l)
gotos=$({ grep -hE '^[[:blank:]]*goto ' "${sources[@]}" || true; } | wc -l)
state=$({ sh tests/house/state.sh || true; } | wc -l)
functions=$(wc -l <"$work/functions")
statics=$(grep -c ' static$' "$work/functions" || true)
for file in "${sources[@]}"; do eval "$COMPILE -c \"\$file\" -o \"\$work/object\"" 2>&1 || true; done |
    { grep -c 'warning:' || true; } >"$work/warnings"

row 'measure' 'measured' 'target'
row "lines of code in src and include ($(wc -l <<<"$(printf '%s\n' "${code[@]}")") files)" "$(awk '{ n += $3 } END { print n }' "$work/lines")" '-'
row 'function, median / 95th percentile / longest' "$(spread "$work/length" 50 95 100)" '<= 10 / <= 45 / <= 90'
row 'functions over 60 lines' "$(awk '$1 > 60 { n++ } END { print n + 0 }' "$work/length") of $functions" 'dispatch over tables only'
row 'McCabe, 95th percentile / largest' "$(spread "$work/mccabe" 95 100)" '<= 8 / <= 15'
row 'nesting (braces), 95th percentile / deepest' "$(spread "$work/depths" 95 100)" '<= 3 / <= 5'
row 'parameters, median / 95th percentile / most' "$(spread "$work/parameters" 50 95 100)" '2 / <= 4 / <= 6'
row 'file, median / longest' "$(spread "$work/file" 50 100)" '100-200 / <= 500'
row 'include depth, bluecone.h / any .c' "$(depth include/bluecone/bluecone.h) / $(depth "${sources[@]}" | at 100)" '<= 2 / <= 4'
row 'project headers a .c sees, median' "$(at 50 <"$work/seen")" '<= 6'
row 'static functions' "$(percent "$statics" "$functions")" '>= 60 %'
row 'public functions' "$api" '<= 100 at 12,000 lines'
row 'public declarations explained in the header' "$(percent "$explained" "$api")" '100 %'
row 'table rows with source (last column of the .def)' "$sourced of $rows" '100 %'
row 'comments / (code + comments)' "$(awk '{ code += $3; comments += $4 } END { if (code) printf "%.0f %%", 100 * comments / (code + comments) }' "$work/lines")" '18-28 %'
row 'comment lines per 100 code lines in bodies' "$(cat "$work/in_bodies")" '<= 12'
row 'writable objects in the library' "$state" '0'
row "warnings, ${COMPILE%% *}" "$(cat "$work/warnings")" '0'
row 'check values with named source' "$checks" '>= 1,000'
row 'documented examples that are run' "$examples found" 'all'
row 'goto (forward, to one clean-up label only)' "$gotos" '0 other than clean-up'
echo
echo 'The longest functions:'
awk '{ print $4 - $3 + 1, $1 ":" $3, $2 }' "$work/functions" | sort -rn | sed -n '1,5s/^/  /p'
echo 'The largest by McCabe:'
pmccabe "${sources[@]}" | sort -rnk2 | awk '{ print "  " $2, $6, $7 }' | sed -n '1,5p'
