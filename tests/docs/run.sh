#!/bin/bash
# Runs what the documents show: tests/docs/run.sh [DOCUMENT...]
#
# In README.md and DEVELOPERS.md each line "$ COMMAND" of a fenced block, in man/*.[1357] of a block
# .Bd -literal, is run by a shell, in a copy of the source tree's folders examples and compositions,
# with bluecone first in PATH. The lines below it, up to the next command or the end of the block,
# must be what it prints: both streams as a terminal shows them, or standard output alone. The
# commands of one document share a folder. examples/NAME.sh must print examples/NAME.out. Composition
# files shown whole must be accepted.
# UPDATE=1 writes the outputs into the documents instead of comparing.
#
# Then: links and pictures; every option stands in the page and the help of its command, and only there; every help fits
# a screen; every quantity and method is listed; the completion of the shell answers.
#
# Speaks the Test Anything Protocol; exit 1 when one test fails.
set -u
export LC_ALL=C
unset BLUECONE_PATH NO_COLOR COLUMNS CDPATH

SRC=$(cd "$(dirname "$0")/../.." && pwd) || exit 2
command -v bluecone >/dev/null || PATH=$SRC/build/release:$PATH
command -v bluecone >/dev/null || { echo 'run.sh: no program bluecone: run make first' >&2; exit 2; }
PATH=$SRC/tests/sqlite/bin:$(dirname "$(command -v bluecone)"):$PATH
# The module for SQLite is built where its headers are: without it, what is shown of it cannot be run.
test -e "$(dirname "$(command -v bluecone)")/bluecone_sqlite.so" && has_sqlite=true || has_sqlite=false
UPDATE=${UPDATE:-0}

work=$(mktemp -d) || exit 2
trap 'rm -rf "$work"' EXIT
trap 'exit 2' INT TERM

# Programs that a document compiles find the library that was built with the program.
build=$(dirname "$(command -v bluecone)")
export PKG_CONFIG_PATH=$build LD_LIBRARY_PATH=$build
# shellcheck source=tests/library/python.sh
. "$SRC/tests/library/python.sh"
use_python "$build" "$work/bin"

# shellcheck source=tests/tap.sh
. "$SRC/tests/tap.sh"

# ---- documents ------------------------------------------------------------------------------------
# A line of a document as it is shown, and back; mdoc has marks of its own.
shown() { if $is_page; then sed -e 's/^\\&//' -e 's/\\e/\\/g' -e 's/\\-/-/g'; else cat; fi; }
written() { if $is_page; then sed -e 's/\\/\\e/g' -e "s/^[.']/\\\\\\\\\&&/"; else cat; fi; }

# run_command: runs $command, leaves both streams in $work/both and standard output in $work/out.
run_command() {
    (cd "$work/cwd" && bash -c "$command" </dev/null >"$work/both" 2>&1)
    # Once more for standard output alone, only where both streams are not what is shown.
    test "$UPDATE" = 0 && ! cmp -s "$work/both" "$work/want" &&
        (cd "$work/cwd" && bash -c "$command" </dev/null >"$work/out" 2>/dev/null)
}

# close_command: judges the command read last and the output shown below it.
close_command() {
    test -n "$command" || return 0
    : >"$work/out"
    run_command
    if test "$UPDATE" != 0; then
        written <"$work/both" >>"$work/new"
    elif cmp -s "$work/both" "$work/want" || cmp -s "$work/out" "$work/want"; then
        : >"$work/difference"
        point "$name:$at: $command" "$work/difference"
    else
        diff -u --label shown --label printed "$work/want" "$work/both" >"$work/difference"
        point "$name:$at: $command" "$work/difference"
    fi
    command=
}

# check_document NAME
check_document() {
    local line number=0 inside=false
    name=$1
    command=
    case $name in *.[1-9]) is_page=true ;; *) is_page=false ;; esac
    rm -rf "$work/cwd" && mkdir "$work/cwd" && cp -r "$SRC/examples" "$SRC/compositions" "$work/cwd" || exit 2
    : >"$work/new"
    while IFS= read -r line; do
        number=$((number + 1))
        if $inside; then
            case $line in
            '```'* | .Ed*) close_command; inside=false ;;
            '$ '*)
                close_command
                command=$(printf '%s\n' "${line#'$ '}" | shown)
                at=$number
                : >"$work/want"
                ;;
            *)
                test -z "$command" || printf '%s\n' "$line" | shown >>"$work/want"
                test -z "$command" || continue
                ;;
            esac
        else
            case $line in '```'* | '.Bd -literal'*) inside=true ;; esac
        fi
        printf '%s\n' "$line" >>"$work/new"
    done <"$SRC/$name"
    close_command
    test "$UPDATE" = 0 || cmp -s "$work/new" "$SRC/$name" || cp "$work/new" "$SRC/$name"
}

# check_example NAME: a script of examples/ against the output stored beside it.
check_example() {
    rm -rf "$work/cwd" && mkdir "$work/cwd" && cp -r "$SRC/examples" "$work/cwd" || exit 2
    (cd "$work/cwd" && sh "examples/$1.sh" </dev/null >"$work/both" 2>&1) || echo "exit $?" >>"$work/both"
    test "$UPDATE" = 0 || cp "$work/both" "$SRC/examples/$1.out"
    diff -u --label "examples/$1.out" --label printed "$SRC/examples/$1.out" "$work/both" >"$work/difference" 2>&1
    point "examples/$1.sh prints what is stored beside it" "$work/difference"
}

# check_file NAME: the composition file that a document shows is one.
check_file() {
    awk '/^```|^\.Bd|^\.Ed/ { if (inside) exit } /^\[gas\]/ { inside = 1 } inside' "$SRC/$1" >"$work/shown.ini"
    bluecone get hhv --bare "$work/shown.ini" >/dev/null 2>"$work/missing"
    point "the composition file shown in $1 is accepted" "$work/missing"
}

# The scripts of examples/ are one story: their numbers go up by one, and the second line of each tells its own.
check_steps() {
    local step=0 example number
    for example in "$SRC"/examples/[0-9]*.sh; do
        step=$((step + 1))
        example=${example##*/}
        number=$((10#${example%%-*}))
        test "$number" -eq "$step" || echo "examples/$example stands where step $step is missing"
        sed -n 2p "$SRC/examples/$example" | grep -q ", step $number:" || echo "examples/$example does not tell step $number"
    done >"$work/difference"
    point 'the scripts of examples/ are numbered as one story' "$work/difference"
}

# check_links NAME: what a document links to in this tree is there.
check_links() {
    grep -o '](\([^)]*\))' "$SRC/$1" | sed -e 's/^](//' -e 's/)$//' -e 's/#.*//' | grep -v -e '^$' -e '^[a-z]*:' | while read -r path; do
        test -e "$SRC/$path" || echo "$1 links to $path, which is not there"
    done >"$work/missing"
    point "the links of $1 lead somewhere" "$work/missing"
}

# What a chart says in words, which do not hang on the fonts of a machine as its lines do.
words_of_chart() { sed -n '/<title>/,/<\/desc>/p' "$1"; }

check_pictures() {
    local picture
    for picture in blend.svg report.png report.txt; do
        grep -q "(examples/pictures/$picture)" "$SRC/README.md" || echo "README.md does not show $picture"
        test "$(stat -c %s "$SRC/examples/pictures/$picture")" -lt 200000 || echo "$picture is larger than 200 kB"
    done >"$work/missing"
    test "$(head -c 8 "$SRC/examples/pictures/report.png" | od -An -c | tr -d ' ')" = '211PNG\r\n032\n' || echo 'report.png is none' >>"$work/missing"
    point 'README.md shows its pictures, which are small' "$work/missing"

    mkdir -p "$work/pictures"
    {
        sh "$SRC/examples/pictures/make.sh" "$work/pictures"
        diff -u --label stored --label now "$SRC/examples/pictures/report.txt" "$work/pictures/report.txt"
        words_of_chart "$SRC/examples/pictures/blend.svg" >"$work/want"
        words_of_chart "$work/pictures/blend.svg" | diff -u --label stored --label now "$work/want" -
        test -s "$work/want" || echo 'blend.svg says nothing'
    } >"$work/missing" 2>&1
    test ! -s "$work/missing" || echo 'run examples/pictures/make.sh, and look at the pictures' >>"$work/missing"
    point 'the pictures show what the program answers now' "$work/missing"
}

# ---- help, pages and lists ------------------------------------------------------------------------
# Rows "option command" of options.def.
options_of_table() {
    sed -n 's/^OPTION([a-z0-9_]*, *"\([^"]*\)", *"[^"]*", *\([A-Z |]*\),.*/\1 \2/p' "$SRC/src/cli/options.def" |
        while read -r option commands; do
            for c in $(printf '%s\n' "$commands" | tr 'A-Z|' 'a-z '); do echo "$option $c"; done
        done
}

check_options() {
    local option command page
    : >"$work/missing"
    options_of_table >"$work/options"
    test -s "$work/options" || echo 'options.def could not be read' >>"$work/missing"
    while read -r option command; do
        page=$SRC/man/bluecone-$command.1
        bluecone "$command" --help | grep -q -e "--$option\( \|\$\)" || echo "$command --help does not tell --$option" >>"$work/missing"
        grep -q "^\.It.* Fl -$option\( \|\$\)" "$page" || echo "${page##*/} does not tell --$option" >>"$work/missing"
    done <"$work/options"
    point 'every option stands in the help and the page of its command' "$work/missing"

    : >"$work/missing"
    for command in $(bluecone list commands --bare); do
        sed -n 's/^\.It.* Fl -\([a-z0-9-]*\).*/\1/p' "$SRC/man/bluecone-$command.1" | while read -r option; do
            grep -qx "$option $command" "$work/options" || echo "bluecone-$command(1) tells --$option, which is none" >>"$work/missing"
        done
    done
    point 'no page tells an option that its command does not have' "$work/missing"
}

# A page has these sections, in this order.
SECTIONS='NAME SYNOPSIS DESCRIPTION OPTIONS EXIT_STATUS EXAMPLES STANDARDS CAUTIONS'
check_pages() {
    local page
    : >"$work/missing"
    for page in "$SRC"/man/*.[1357]; do
        # SEE ALSO and ENVIRONMENT stand where mdoc wants them, in pages that have them.
        test "$(sed -n -e '/^\.Sh SEE ALSO/d' -e '/^\.Sh ENVIRONMENT/d' -e 's/^\.Sh //p' "$page" | tr ' ' '_' | tr '\n' ' ')" = "$SECTIONS " ||
            case $page in
            *.[357]) ;; # the library, files and methods take no options and end with no code
            *) echo "${page##*/} does not have the sections $SECTIONS" >>"$work/missing" ;;
            esac
    done
    for command in $(bluecone list commands --bare); do
        test -e "$SRC/man/bluecone-$command.1" || echo "there is no man/bluecone-$command.1" >>"$work/missing"
    done
    point 'every command has its page, with all sections' "$work/missing"
    mandoc -T lint -W warning "$SRC"/man/*.[1357] >"$work/missing" 2>&1
    point 'mandoc finds nothing in the pages' "$work/missing"
    for page in "$SRC"/man/*.[1357]; do
        groff -mdoc -ww -T utf8 -z "$page" 2>&1 | sed "s|$SRC/||"
    done >"$work/missing"
    point 'groff finds nothing in the pages' "$work/missing"
}

check_help() {
    local command
    : >"$work/missing"
    for command in '' $(bluecone list commands --bare); do
        # shellcheck disable=SC2086 # no command is no word
        bluecone $command --help >"$work/help"
        test "$(wc -l <"$work/help")" -le 24 || echo "bluecone $command --help has more than 24 lines" >>"$work/missing"
        awk -v c="$command" 'length > 80 { print "bluecone " c " --help is wider than 80 columns: " $0 }' "$work/help" >>"$work/missing"
    done
    point 'every help fits a screen' "$work/missing"
    # An example may answer no, but not be refused; that of the log needs one.
    cp "$SRC/examples/log-of-two-weeks.csv" "$work/cwd/log.csv"
    : >"$work/missing"
    for command in $(bluecone list commands --bare); do
        bluecone "$command" --help | sed -n 's/^  \(bluecone .*\)/\1/p' >"$work/example"
        test -s "$work/example" || echo "bluecone $command --help shows no example" >>"$work/missing"
        (cd "$work/cwd" && bash "$work/example" >/dev/null 2>"$work/told") || test $? -eq 1 || cat "$work/example" "$work/told" >>"$work/missing"
    done
    point 'every example of a help runs' "$work/missing"
}

# check_listed TOPIC EXPRESSION FILE...: the ids that sed finds in the tables are those of `list TOPIC`.
check_listed() {
    local topic=$1 expression=$2 file
    shift 2
    for file; do
        sed -n "$expression" "$SRC/$file" >"$work/rows"
        test -s "$work/rows" || echo "$file could not be read"
        cat "$work/rows"
    done | sort >"$work/table"
    bluecone list "$topic" --bare | sort >"$work/listed"
    diff "$work/table" "$work/listed" >"$work/missing"
    point "list $topic has every row of $*" "$work/missing"
}

check_methods_page() {
    local id
    : >"$work/missing"
    for id in $(bluecone list methods --bare); do
        grep -q "^\.It.*Sy $id\$" "$SRC/man/bluecone-methods.7" || echo "bluecone-methods(7) does not tell $id" >>"$work/missing"
    done
    point 'every method stands in bluecone-methods(7)' "$work/missing"
}

if test $# -gt 0; then
    for document; do check_document "$document"; done
else
    for document in README.md DEVELOPERS.md man/*.[1357]; do
        case $document in
        man/*)
            for page in "$SRC"/$document; do
                if $has_sqlite || test "${page##*/}" != bluecone-sqlite.7; then check_document "man/${page##*/}"; fi
            done
            ;;
        *) check_document "$document" ;;
        esac
    done
    for example in "$SRC"/examples/*.sh; do
        example=${example##*/}
        if ! $has_sqlite && grep -q sqlite3 "$SRC/examples/$example"; then continue; fi
        check_example "${example%.sh}"
    done
    check_file README.md
    check_file man/bluecone-composition.5
    check_steps
    check_links README.md
    check_links DEVELOPERS.md
    check_pictures
    check_options
    check_pages
    check_help
    check_listed quantities 's/^\(POWER\|OTHER\|FLAME\|ALONE\)("\([^"]*\)".*/\2/p' src/value/quantities.def src/flame/quantities_flame.def \
        src/data/quantities_index.def
    check_listed methods 's/^METHOD("\([^"]*\)".*/\1/p' src/data/methods.def
    check_methods_page
    test ! -e "$SRC/tests/docs/completion.sh" || bash "$SRC/tests/docs/completion.sh" >"$work/missing" 2>&1
    test ! -e "$SRC/tests/docs/completion.sh" || point 'the completion of bash answers' "$work/missing"
fi
echo "1..$count"
test "$failed" -eq 0
