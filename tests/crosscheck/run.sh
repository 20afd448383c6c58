#!/bin/bash
# Compares with reference libraries from PyPI in a virtual environment of their own; called by `make crosscheck`,
# which sets SRC, PATH and CC.
set -euo pipefail
build=$(dirname "$(command -v bluecone)")
work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT
venv="$SRC/build/crosscheck"

if ! cmp -s "$SRC/tests/crosscheck/requirements.txt" "$venv/installed.txt"; then
    rm -rf "$venv"
    python3 -m venv "$venv"
    "$venv/bin/pip" install --quiet --disable-pip-version-check -r "$SRC/tests/crosscheck/requirements.txt"
    cp "$SRC/tests/crosscheck/requirements.txt" "$venv/installed.txt"
fi
python="$venv/bin/python"

compile() {
    "${CC:-gcc}" -std=c11 -O2 -D_POSIX_C_SOURCE=200809L -I "$SRC/include" -I "$SRC/src" -o "$work/$1" "$2" \
        "$build/libbluecone.a" -liniparser -lm
}
compile flames "$SRC/tests/crosscheck/flames.c"
compile bench_flame "$SRC/tests/bench/bench_flame.c"
compile steam_table "$SRC/tests/crosscheck/steam_table.c"

failed=0
passed=0
run() {
    local name=$1
    shift
    if "$@"; then
        passed=$((passed + 1))
        echo "ok: $name"
    else
        failed=$((failed + 1))
        echo "FAILED: $name"
    fi
}
"$work/flames" 300 >"$work/flames.txt"
"$work/steam_table" >"$work/steam.txt"
rate=$("$work/bench_flame" | sed -n 's/^equilibrium, lambda 1  *\([0-9]*\) cases.*/\1/p')
run "flames against Cantera" sh -c "'$python' '$SRC/tests/crosscheck/compare_flames.py' $rate <'$work/flames.txt'"
run "water against IAPWS" sh -c "'$python' '$SRC/tests/crosscheck/compare_steam.py' <'$work/steam.txt'"
for more in "$SRC"/tests/crosscheck/more_*.sh; do
    [ -e "$more" ] || continue
    run "$(basename "$more" .sh)" bash "$more" "$python" "$work"
done
echo "$passed passed, $failed failed"
[ "$failed" -eq 0 ]
