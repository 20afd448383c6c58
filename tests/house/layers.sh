#!/bin/sh
# A file includes its own floor and those below it. The output floor knows the floors base and data
# and nothing of gases; the floor of SQLite, beside the command line, knows the public headers and base. Public headers live on the floor of the .c file that has their name; those
# without one are listed here.
set -eu

{
    find "$SRC/include" "$SRC/src" -type f \( -name '*.[ch]' -o -name '*.def' \) | sed "s|^$SRC/||"
    echo --
    sh "$(dirname "$0")/edges.sh"
} | awk '
BEGIN {
    count = split("data base gas value flame supply output cli", name, " ")
    for (i = 1; i <= count; i++) floor[name[i]] = i
    floor["sqlite"] = floor["cli"]
    listed["include/bluecone/bluecone.h"] = "supply"
}
function stem(path) { sub(/.*\//, "", path); sub(/\.[a-z]*$/, "", path); return path }
function folder(path, part) { split(path, part, "/"); return part[2] }
function complain(text) { print "layers: " text; bad = 1 }
# The folder whose floor a file belongs to; "" when nobody knows.
function home(path) {
    if (path ~ /^src\//) return folder(path)
    if (path in listed) return listed[path]
    return source[stem(path)]
}
$1 == "--" { edges = 1; next }
!edges {
    files[++total] = $1
    if ($1 ~ /^src\/[a-z]*\/.*\.c$/) source[stem($1)] = folder($1)
    next
}
$2 ~ /^\?/ { complain($1 " includes " substr($2, 2) ", which is not there"); next }
{
    from = home($1); to = home($2)
    if (from == "" || to == "") next # complained about below
    if (floor[to] > floor[from])
        complain($1 " (floor " from ") includes " $2 " (floor " to ")")
    else if (from == "output" && to ~ /^(gas|value|flame|supply)$/)
        complain($1 " includes " $2 ": the output floor knows nothing of gases")
    else if (from != "sqlite" && to == "sqlite")
        complain($1 " includes " $2 ": nothing rests on the floor of SQLite")
    else if (from == "sqlite" && to !~ /^(sqlite|base)$/ && $2 !~ /^include\//)
        complain($1 " includes " $2 ": the floor of SQLite knows the public headers and base alone")
}
END {
    for (i = 1; i <= total; i++)
        if (!(home(files[i]) in floor)) complain(files[i] ": its floor is unknown; list it in tests/house/layers.sh")
    exit bad
}'
