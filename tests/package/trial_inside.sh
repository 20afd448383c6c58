#!/bin/sh
# What is tried in a fresh Debian, as root: trial_inside.sh FOLDER_OF_THE_PACKAGES
#
# bluecone is installed alone, where what needs a library that is recommended only must say so; then with what it
# recommends, where the examples must print what is stored beside them; then the library, shared and static. In the
# end everything goes, and no file may be left.
set -eu

packages=$1
export LC_ALL=C DEBIAN_FRONTEND=noninteractive
work=$(mktemp -d)
cd "$work"

say() { echo "trial: $*"; }
fail() { say "FAILED: $*"; exit 1; }
install() { apt-get install -y -q --no-install-recommends "$@" >log 2>&1 || { cat log; fail "install $*"; }; }
recommended() { dpkg-query -W -f '${Recommends}' "$1" | tr , '\n' | sed -e 's/(.*//' -e 's/ //g'; }

# refused WORD COMMAND...: exit code 4, one line that names the Debian package WORD, and no file.
refused() {
    word=$1
    shift
    code=0
    "$@" >out 2>err || code=$?
    test "$code" -eq 4 || fail "exit code $code, not 4: $*"
    test "$(wc -l <err)" -eq 1 || fail "more than one line: $(cat err)"
    grep -q "install.*$word" err || fail "$word is not named: $(cat err)"
    test -z "$(find . -name 'answer.*')" || fail "a file is left: $*"
}

# An image's own packages may leave this out; here the documents belong to what is tried.
rm -f /etc/dpkg/dpkg.cfg.d/*
apt-get update -q >log 2>&1 || { cat log; fail 'apt-get update'; }

say 'bluecone alone'
install "$packages"/bluecone_*.deb
for library in libcairo2 libxlsxwriter4 libnlopt0 libcsv3; do
    ! dpkg-query -W -f '${db:Status-Status}' "$library" 2>/dev/null | grep -q -x installed || fail "$library is there: nothing to try"
done
examples=/usr/share/doc/bluecone/examples
bluecone verify >/dev/null || fail 'check values'
test "$(bluecone get hhv --bare --quiet pipeline-h)" != '' || fail 'no bundled gas'
draw() { bluecone blend --quiet 0..30/5 hydrogen rest pipeline-h -o "$1"; }
refused libcairo2 draw answer.svg
refused libxlsxwriter4 draw answer.xlsx
refused libcsv3 bluecone contract --quiet "$examples/contract-marrowfen.ini" --log "$examples/log-of-two-weeks.csv"
refused libnlopt0 bluecone blend --quiet free "$examples/present-supply.ini" free "$examples/hydrogen-offer.ini" free "$examples/propane-works.ini" \
    --price 1=34EUR/MWh --within "$examples/contract-marrowfen.ini" --flow 25MW --least cost
# Without /proc the library cannot hand a text to iniparser, which reads paths only.
mkdir bare
ldd /usr/bin/bluecone | grep -o '/[^ ]*' | xargs cp -L --parents -t bare
cp -r --parents /usr/bin/bluecone /usr/share/bluecone bare
chroot bare /usr/bin/bluecone get hhv --quiet pipeline-h >out 2>err && fail 'a gas read without /proc'
grep -q 'mount /proc' err || fail "/proc is not named: $(cat err)"

say 'with what it recommends'
# shellcheck disable=SC2046 # a list of words
install $(recommended bluecone)
for answer in answer.svg answer.pdf answer.png answer.html answer.xlsx; do
    draw "$answer" || fail "no $answer"
    test -s "$answer" || fail "empty $answer"
done
install parallel sqlite3 # suggested: examples work on a log in parts, and in a database
cp -r "$examples" play # as a user does who wants to change them
for script in play/*.sh; do
    sh "$script" </dev/null >out 2>&1 || echo "exit $?" >>out
    diff -u "${script%.sh}.out" out || fail "$script prints something else"
done
say "$(find play -name '*.sh' | wc -l) examples print what is stored beside them"
for page in bluecone.1 bluecone-get.1 bluecone-composition.5 bluecone-methods.7; do
    test -s "/usr/share/man/man${page##*.}/$page.gz" || fail "no page $page"
done
bash -c '. /usr/share/bash-completion/completions/bluecone && complete -p bluecone' >/dev/null || fail 'no completion'

say 'the library'
install "$packages"/libbluecone*.deb gcc libc6-dev pkg-config
# shellcheck disable=SC2046 # lists of flags
{
    gcc "$examples/library/gas_value.c" -o shared $(pkg-config --cflags --libs bluecone)
    gcc "$examples/library/gas_value.c" -o static $(pkg-config --static --cflags --libs bluecone | sed 's/-lbluecone/-l:libbluecone.a/')
}
readelf -d shared | grep -q 'NEEDED.*libbluecone\.so\.0' || fail 'the program does not use the shared library'
! readelf -d static | grep -q 'NEEDED.*libbluecone' || fail 'the program does not use the static library'
for program in shared static; do
    (cd play && "$work/$program" present-supply.ini new-supply-offer.ini hydrogen-blend.ini) >out 2>&1 || fail "$program: $(cat out)"
    diff -u play/library/gas_value.out out || fail "the example of the library prints something else: $program"
done
for page in bluecone bluecone_gas; do
    test -s "/usr/share/man/man3/$page.3.gz" || fail "no page $page(3)"
done

say 'removal'
own='bluecone libbluecone0 libbluecone-dev'
# shellcheck disable=SC2086 # a list of words
{
    dpkg -L $own | grep -v -x /. | sort -u >files
    apt-get purge -y -q $own >log 2>&1 || { cat log; fail purge; }
}
# Folders that other packages have, too, stay.
while read -r path; do
    test ! -e "$path" || dpkg -S "$path" >/dev/null 2>&1 || fail "left: $path"
done <files
left=$(find / -xdev \( -path /proc -o -path "$work" -o -path "$packages" -o -path /var/cache -o -path /var/log \) -prune -o -name '*bluecone*' -print)
test -z "$left" || fail "left: $left"
say 'all is well'
