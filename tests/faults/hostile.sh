#!/bin/bash
# Hostile inputs by the thousand: tests/faults/hostile.sh -b BUILD_FOLDER COUNT
#
# Names with markup, formulas and orders for a terminal, numbers of every kind, files that are none, contracts that follow
# each other in a circle; into every command and form. None may crash, hang or get into a terminal, a page, a workbook, a
# drawing or a spreadsheet. Speaks the Test Anything Protocol, one test a kind of input.
# shellcheck disable=SC2015,SC2016,SC2086,SC2317 # functions are called by name, codes are numbers, payloads are no commands
set -u

SRC=$(cd "$(dirname "$0")/../.." && pwd) || exit 2
test "${1:-}" = -b && test $# -eq 3 || { echo "hostile.sh: -b BUILD_FOLDER COUNT" >&2; exit 2; }
build=$(cd "$2" && pwd) || exit 2
count=$3
# shellcheck source=tests/faults/scratch.sh
. "$SRC/tests/faults/scratch.sh"

payloads=('<script>alert(1)</script>' '"><img src=x onerror=alert(1)>' ']]></svg><script>alert(1)</script>' '&lt;&#0;&nosuch;'
    $'\e[2J\e]0;x\a' $'\302\233 31m\r\b\177' '=HYPERLINK("http://x","y")' '+1+1' '-2+3|cmd' '@SUM(A1)' $'\342\200\256drowkcab' $'\300\257\355\240\200'
    "$(printf 'x%.0s' {1..300})" "'\"\"';--" '%s%n%x%99999d' '../../../../etc/passwd' '$(touch pwned)`id`' '[a]:b*c?d/e\f' '_x0041_' $'\357\277\276' ' ' '; #=' 'nan' '-o')
numbers=(1e308 1e-308 1e400 -1 nan inf 0x1p3 1e-320 0 0000092 '9,5' 92. .5 '' 92%% 99999999999999999999 4.9e-324 -0 +5 1_000 '5 5' 1e 'rest' $'\331\241' 1e999999999999)
forms=(txt json csv html xlsx svg text)
bad=0
runs=0

complain() {
    bad=$((bad + 1))
    printf '# %s: bluecone' "$1"
    printf ' %q' "${words[@]}"
    printf '\n'
}

# No orders for a terminal: nothing below a blank but line feed and tab.
harmless() { ! grep -q -a -P '[\x00-\x08\x0b-\x1f\x7f]' "$1"; }

# Numbers may begin with a minus, and a minus alone is no figure; a text that is a formula has an apostrophe in front.
no_formula() { ! grep -q -a -P '(^|,)("?[=+@\t\r]|"?-(?![0-9.,]|"?,|$))' "$1"; }

check_file() {
    case $1 in
    *.txt | *.csv | *.json) harmless "$1" || complain "control characters in $1" ;;&
    *.csv) no_formula "$1" || complain "a formula in $1" ;;
    *.html | *.svg) ! grep -q -a -i -e '<script>alert' -e '<img src=x' "$1" || complain "markup in $1" ;;&
    *.html) xmllint --html --noout "$1" 2>&1 | grep -v -e 'Tag [a-z]* invalid' -e '^ *\^' -e '^[^:]*$' | grep -q ' error : ' && complain "not well-formed: $1" ;;
    *.svg) xmllint --noout --nonet "$1" >/dev/null 2>&1 || complain "not well-formed: $1" ;;
    *.xlsx) check_workbook "$1" ;;
    esac
}

check_workbook() {
    rm -rf book && mkdir book && unzip -q -d book "$1" || complain "no archive: $1"
    find book -type f -print0 | xargs -0 xmllint --noout --nonet >/dev/null 2>&1 || complain "not well-formed: $1"
    ! grep -q -r -a -e '<f>' -e '<f ' book/xl/worksheets || complain "a formula in $1"
}

# run WORDS...: `out` in them stands for a file in the form whose turn it is.
run() {
    local form=${forms[runs % ${#forms[@]}]} code
    words=("$@")
    rm -f out.*
    case $form in
    text) ;;
    svg) case $1 in burn | blend | switch | contract) words+=(-o out.svg) ;; *) words+=(-o out.html) ;; esac ;;
    *) words+=(-o "out.$form") ;;
    esac
    runs=$((runs + 1))
    timeout -k 1 30 "$build/bluecone" "${words[@]}" >stdout 2>stderr </dev/null
    code=$?
    test $code -le 4 || complain "exit code $code"
    harmless stdout || complain "control characters in standard output"
    harmless stderr || complain "control characters in standard error"
    test $code -lt 2 || test "$(wc -l <stderr)" -ge 1 || complain "no message"
    test $code -lt 2 || ! ls out.* >/dev/null 2>&1 || complain "a file is left"
    for f in out.*; do
        test ! -e "$f" || check_file "$f"
    done
    test ! -e pwned || complain "a command of the input was run"
}

# ---- kinds of input: $1 counts, $payload and $number change with it ---------------------------------------------------

composition() {
    printf '[gas]\nname = %s\nsource = %s\nfamily = %.20s\n[components]\nmethane = 92\nethane = %s\nnitrogen = 3\n[uncertainty]\nmethane = %s\n' \
        "$payload" "$payload" "$payload" "$((1 + $1 % 5))" "$number" >gas.ini
    test $(($1 % 3)) -ne 0 || sed -i -e 's/^methane = .*/methane = 92/' gas.ini
    test $(($1 % 4)) -ne 1 || sed -i -e "3,\$s/^ethane = .*/ethane = ${number//[\/&]/}/" gas.ini
    case $(($1 % 4)) in
    0) run sheet gas.ini g20 --working ;;
    1) run get hhv,wobbe-gross gas.ini ;;
    2) run burn gas.ini --sweep excess=0..40 ;;
    3) run switch g20 gas.ini --blend-in ;;
    esac
}

literal() {
    case $(($1 % 4)) in
    0) run get hhv "methane=$number,ethane=8" ;;
    1) run sheet "methane=92,$payload=8" ;;
    2) run burn "methane=92~$number,ethane=8" --excess "$number" ;;
    3) run blend "$number" g20 rest biogas ;;
    esac
}

contract() {
    printf '[contract]\nname = %s\nsource = %s\n[limit wobbe-gross]\nmin = %s\nmax = 54\nunit = MJ/m3\nnote = %.100s\n[limit hydrogen]\nmax = %s\n' \
        "$payload" "$payload" 45 "$payload" 2 >contract.ini
    test $(($1 % 2)) -eq 0 || sed -i "s/^max = 2/max = ${number//[\/&]/}/" contract.ini
    case $(($1 % 3)) in
    0) run contract contract.ini g20 --against biogas ;;
    1) run contract contract.ini g20 --traps ;;
    2) run blend rest g20 free biogas --within contract.ini ;;
    esac
}

burner() {
    printf '[burner]\nname = %.90s\nsource = %.150s\ntype = nozzle\ncontrol = fixed\ninput = 2.5 MW\ngas_pressure = %s mbar\n[air]\nlambda = %s\n' \
        "$payload" "$payload" 50 1.2 >burner.ini
    test $(($1 % 2)) -eq 0 || sed -i "s/^lambda = .*/lambda = ${number//[\/&]/}/" burner.ini
    run switch g20 "methane=80,hydrogen=20" --burner burner.ini
}

log() {
    printf 'time,methane,nitrogen,"%s"\n2026-03-01T00:00,97,3,"%s"\n%s,97,3,x\n2026-03-01T02:00,%s,3,\n' \
        "${payload//\"/\"\"}" "${payload//\"/\"\"}" "$payload" "$number" >log.csv
    printf '[contract]\nname = c\n[limit wobbe-gross]\nmin = 51\nmax = 54\nunit = MJ/m3\n' >contract.ini
    case $(($1 % 4)) in
    0) run contract contract.ini --log log.csv ;;
    1) run stream log.csv --contract contract.ini --summary ;;
    2) timeout -k 1 30 "$build/bluecone" stream log.csv --quiet >rows 2>stderr; words=(stream log.csv); test $? -le 4 || complain "exit code"; harmless stderr || complain "control characters in standard error" ;;
    3) run stream log.csv --summary --columns "$payload" --no-header ;;
    esac
}

# A file whose name is hostile.
name() {
    local file=${payload//\//_}
    file=./${file:0:200}.ini
    printf '[components]\nmethane = 97\nnitrogen = 3\n' >"$file" 2>/dev/null || return 0
    case $(($1 % 3)) in
    0) run sheet "$file" ;;
    1) run get hhv "$file" g20 ;;
    2) run contract "$file" g20 ;;
    esac
    rm -f "$file"
}

option() {
    case $(($1 % 12)) in
    0) run get "$payload" g20 ;;
    1) run get hhv g20 --unit "$payload" ;;
    2) run get hhv g20 --at "$number/$number" ;;
    3) run sheet g20 --digits "$number" ;;
    4) run burn g20 --humidity "$payload" ;;
    5) run burn g20 --lambda "$number" ;;
    6) run burn g20 --rate "$number kg/h" ;;
    7) run blend 70 g20 30 biogas --price "biogas=$number $payload/MWh" ;;
    8) run contract "$payload" g20 ;;
    9) run list "$payload" ;;
    10) run "$payload" g20 ;;
    11) run burn g20 --reading "nox=${number}ppm,$payload=3" ;;
    esac
}

# Files that are none, and circles.
special() {
    rm -rf special && mkdir special && mkfifo special/fifo && ln -s loop special/loop && ln -s nowhere special/dangling && mkdir special/folder
    ln -s /dev/zero special/zero && : >special/empty && head -c 300000 /dev/zero | tr '\0' 'a' >special/large && printf '\0\0' >special/nul
    printf '[contract]\nfollows = b.ini\n[limit hydrogen]\nmax = 1\n' >special/a.ini
    printf '[contract]\nfollows = ./a.ini\n[limit hydrogen]\nmax = 1\n' >special/b.ini
    for n in 0 1 2 3 4 5 6 7; do printf '[contract]\nfollows = deep%d.ini\n[limit hydrogen]\nmax = 1\n' $((n + 1)) >special/deep$n.ini; done
    { printf '[a'; printf '[b%.0s' {1..400}; printf ']\nx = 1\n'; } >special/nested
    local all=(fifo loop dangling folder zero empty large nul a.ini deep0.ini nested)
    local file=special/${all[$1 % ${#all[@]}]}
    case $(($1 / ${#all[@]} % 6)) in
    0) run sheet "$file" ;;
    1) run contract "$file" g20 ;;
    2) run switch g20 biogas --burner "$file" ;;
    3) test "$file" = special/fifo || test "$file" = special/zero || run contract gb-gsmr-2025 --log "$file" ;; # a log may be a pipe
    4) run stream --merge "$file" ;;
    5) run contract gb-gsmr-2025 "$file" ;;
    esac
}

kinds=(composition literal contract burner log name option special)
each=$(((count + ${#kinds[@]} - 1) / ${#kinds[@]}))
echo "1..${#kinds[@]}"
failed=0
number_of=0
for kind in "${kinds[@]}"; do
    bad=0
    for ((i = 0; i < each; i++)); do
        payload=${payloads[i % ${#payloads[@]}]}
        number=${numbers[(i * 7 + i / ${#payloads[@]}) % ${#numbers[@]}]}
        $kind $i
    done
    number_of=$((number_of + 1))
    test $bad -eq 0 && verdict=ok || { verdict='not ok'; failed=1; }
    echo "$verdict $number_of - $each hostile inputs: $kind"
done
exit $failed
