#!/bin/bash
# Proves the rules: a small sound tree passes all of them, and each violation put into a copy of it
# is refused by its rule, with the expected words.
set -euo pipefail

rules=$(cd "$(dirname "$0")" && pwd)
: "${CC:=gcc}"
SOUND=$WORK/sound
failed=0

# put FILE: stdin becomes a file of the tree at hand.
put() { mkdir -p "$(dirname "$SRC/$1")" && cat >"$SRC/$1"; }

plant_sound_tree() {
    put include/bluecone/status.h <<<'/* Status. */
#ifndef STATUS_H
#define STATUS_H
#ifdef __cplusplus
extern "C" {
#endif
typedef struct {
    int line; /* of a file */
    double t_k;
} bc_place;
__attribute__((visibility("default"))) int bc_status_value(void);
#ifdef __cplusplus
}
#endif
#endif'
    put include/bluecone/wobbe.h <<<'/* Wobbe. */
#include "bluecone/status.h"
__attribute__((visibility("default"))) double bc_wobbe(double h, double d);'
    put src/base/status.c <<<'/* Status. */
#include "bluecone/status.h"
static const char *const WORDS[] = {"one", "two"};
int bc_status_value(void) { return WORDS[0][0]; }'
    put src/value/wobbe.c <<<'/* Wobbe; not by sprintf(). */
#include "bluecone/wobbe.h"
#include <math.h>
double bc_wobbe(double h, double d) { return h / sqrt(d); }'
    put src/output/text.c <<<'/* Text. */
#include "bluecone/status.h"
extern int text; int text;'
    put Makefile </dev/null
}

build() {
    local object
    mkdir -p "$OUT"
    for source in "$SRC"/src/base/*.c "$SRC"/src/value/*.c; do
        object=$OUT/${source#"$SRC"/}
        object=${object%.c}.o
        mkdir -p "$(dirname "$object")"
        "$CC" -w -std=c11 -D_POSIX_C_SOURCE=200809L -O1 -fPIC -fvisibility=hidden -I "$SRC/include" -I "$SRC/src" -c "$source" -o "$object"
    done
    rm -f "$OUT/libbluecone.a"
    ar rcs "$OUT/libbluecone.a" "$OUT"/src/*/*.o
    "$CC" -shared -o "$OUT/libbluecone.so.0" "$OUT"/src/*/*.o -lm
}

fresh_copy() {
    rm -rf "$WORK/mutant"
    cp -r "$SOUND" "$WORK/mutant"
    export SRC=$WORK/mutant OUT=$WORK/mutant/build
}

run_rule() { mkdir -p "$WORK/scratch" && WORK=$WORK/scratch sh "$rules/$1.sh" 2>&1; }

# refuses RULE WORDS: the rule must fail on the tree at hand and say these words. The tree is rebuilt
# only for the rules that look at objects, and is sound again afterwards.
refuses() {
    local said status=0
    case $1 in state | symbols) build ;; esac
    said=$(run_rule "$1") || status=$?
    if [[ $status -eq 0 || $said != *"$2"* ]]; then
        printf 'mutants: %s does not refuse "%s" (exit %d, said: %s)\n' "$1" "$2" "$status" "$said"
        failed=1
    fi
    fresh_copy
}

# forge FLAGS...: what is installed, in small, hardened as the Makefile does it, but for FLAGS; $program as a program.
forge() {
    local hard=(-w -O2 -fPIC -U_FORTIFY_SOURCE -D_FORTIFY_SOURCE=3 -fstack-protector-strong -z relro -z now -z noexecstack)
    case $("$CC" -dumpmachine) in x86_64* | i?86*) hard+=(-fcf-protection) ;; esac
    put src/base/guarded.c <<<'#include <stdio.h>
#include <string.h>
#ifdef WRITTEN_AND_RUN
__attribute__((section(".odd,\"awx\",@progbits #"))) int odd = 3;
#endif
int main(int n, char **words) { char text[16]; memcpy(text, words[0], strlen(words[0]) + 1); return printf("%s%d", text, n); }'
    mkdir -p "$OUT/src/base"
    rm -f "$OUT"/src/*/*.o
    printf '%s\n' "$*" >"$OUT/flags"
    "$CC" "${hard[@]}" "$@" -c "$SRC/src/base/guarded.c" -o "$OUT/src/base/guarded.o"
    "$CC" "${hard[@]}" "${program--pie}" "$@" "$OUT/src/base/guarded.o" -o "$OUT/bluecone"
    for file in libbluecone.so.0 bluecone_chart.so bluecone_workbook.so; do
        "$CC" "${hard[@]}" -shared "$@" "$OUT/src/base/guarded.o" -o "$OUT/$file"
    done
}

# unhardened WORDS FLAGS...: forged with these flags it is refused.
unhardened() {
    local words=$1
    shift
    forge "$@"
    refuses hardening "$words"
}

# What the sound tree exports, needs and lays out is accepted.
accept() {
    put tests/abi/symbols <<<'bc_status_value
bc_wobbe'
    put tests/abi/needs <<<'sqrt   physics'
    mkdir -p "$WORK/scratch" && WORK=$WORK/scratch sh "$rules/interface.sh" print | put tests/abi/interface
}

export SRC=$SOUND OUT=$SOUND/build
plant_sound_tree
build
accept
for rule in layers circles state headers symbols interface toplevel banned names; do
    if ! said=$(run_rule $rule); then
        printf 'mutants: %s refuses the sound tree: %s\n' "$rule" "$said"
        failed=1
    fi
done
fresh_copy

put src/base/status.c <<<'#include "bluecone/wobbe.h"'
refuses layers 'src/base/status.c (floor base) includes include/bluecone/wobbe.h (floor value)'
put src/flame/flue.h </dev/null
put src/value/wobbe.c <<<'  #  include "../flame/flue.h"'
refuses layers 'src/value/wobbe.c (floor value) includes src/flame/flue.h (floor flame)'
put src/output/text.c <<<'#include <bluecone/wobbe.h>'
refuses layers 'the output floor knows nothing of gases'
put src/cli/line.h </dev/null
put src/sqlite/module.h <<<'#include "cli/line.h"'
refuses layers 'the floor of SQLite knows the public headers and base alone'
put src/sqlite/module.h </dev/null
put src/cli/line.c <<<'#include "sqlite/module.h"'
refuses layers 'nothing rests on the floor of SQLite'
put include/bluecone/orphan.h </dev/null
refuses layers 'include/bluecone/orphan.h: its floor is unknown'
put src/base/status.c <<<'#include "nowhere.h"'
refuses layers 'includes nowhere.h, which is not there'
put src/odds/ends.c </dev/null
refuses layers 'src/odds/ends.c: its floor is unknown'

put src/base/a.h <<<'#include "b.h"'
put src/base/b.h <<<'#include "base/c.h"'
put src/base/c.h <<<'#include "a.h"'
refuses circles 'src/base/b.h'
put src/base/a.h <<<'#include "a.h"'
refuses circles 'src/base/a.h includes itself'

for object in 'static int calls; int f(void) { return ++calls; }' 'int shared = 7;' \
    'static _Thread_local int mine = 3; int *f(void) { return &mine; }' \
    'int f(void) { static double last = 2.5; return (int)(last *= 2); }' \
    'static const char *word = "x"; void f(void) { word = "y"; } const char *g(void) { return word; }'; do
    put src/value/extra.c <<<"$object"
    refuses state 'state: writable object'
done

put include/bluecone/wobbe.h <<<'bc_status bc_wobbe(double);'
refuses headers 'bluecone/wobbe.h does not compile alone as C11'
put include/bluecone/wobbe.h <<<'int bc_wobbe(int class);'
refuses headers 'bluecone/wobbe.h does not compile alone as C++'

put src/value/extra.c <<<'__attribute__((visibility("default"))) int helper(void) { return 1; }'
refuses symbols 'do not start with bc_'
put tests/abi/symbols <<<'bc_wobbe'
refuses symbols 'run make symbols'
put tests/abi/needs <<<'sqrt'
refuses symbols 'needs sqrt'
put include/bluecone/wobbe.h <<<'/* Wobbe. */
#include "bluecone/status.h"
__attribute__((visibility("default"))) double bc_wobbe(double d, double h);'
refuses interface '-__attribute__((visibility("default"))) double bc_wobbe(double h, double d)'
sed -i 's/double t_k;/float t_k;/' "$SRC/include/bluecone/status.h"
refuses interface '-  8+8 double t_k'
for call in 'malloc:void *f(void) { return malloc(9); }' 'free:void f(void *p) { free(p); }' \
    'puts:int f(void) { return puts("x"); }' 'exit:void f(void) { exit(3); }' 'abort:void f(void) { abort(); }' \
    'printf:#undef _FORTIFY_SOURCE
#define _FORTIFY_SOURCE 2
int f(const char *s) { return printf("%s%d", s, 2); }' \
    '__assert_fail:#include <assert.h>
void f(int a) { assert(a == 3); }' 'localeconv:#include <locale.h>
char *f(void) { return localeconv()->decimal_point; }' 'getenv:char *f(void) { return getenv("X"); }' 'stderr:int f(void) { return fputs("x", stderr); }'; do
    put src/value/extra.c <<<"#include <stdio.h>
#include <stdlib.h>
${call#*:}"
    refuses symbols "symbols: value/extra.o needs ${call%%:*}"
done
put src/base/status.c <<<'#include <locale.h>
void f(void) { setlocale(LC_ALL, ""); }'
refuses symbols 'symbols: base/status.o needs setlocale'

put TODO.txt </dev/null
refuses toplevel 'TODO.txt has no place there'

for call in atof atoi atol strcpy strcat sprintf gets strtok; do
    put src/base/extra.h <<<"/* x */ int x(void) { return $call (0); }"
    refuses banned "return $call (0); }"
done

put src/cli/wobbe.c <<<'/* Wobbe. */'
refuses names 'wobbe.c is there more than once'
put src/base/extra.def <<<'ROW(1)'
refuses names 'src/base/extra.def does not open with a comment'

forge
said=$(run_rule hardening) || { printf 'mutants: hardening refuses what is hardened: %s\n' "$said"; failed=1; }
program=-no-pie unhardened 'bluecone is not position independent'
program=-shared unhardened 'bluecone is no position independent program'
unhardened 'bluecone_chart.so has no read-only relocations' -Wl,-z,norelro
unhardened 'libbluecone.so.0 binds symbols as it goes' -Wl,-z,lazy
unhardened 'bluecone_workbook.so has a stack that can be run' -Wl,-z,execstack
unhardened 'bluecone has a segment that is both written and run' -DWRITTEN_AND_RUN -Wl,--no-warn-rwx-segments
unhardened 'bluecone brings a path of its own' -Wl,-rpath,/opt/lib
unhardened 'bluecone does not watch its stack' -fno-stack-protector
unhardened 'bluecone has no call of the C library checked' -U_FORTIFY_SOURCE
unhardened 'bluecone prints by unchecked calls' -U_FORTIFY_SOURCE
case $("$CC" -dumpmachine) in
x86_64*)
    unhardened 'bluecone_chart.so has relocations in its code' -fno-pic -mcmodel=large -Wl,-z,notext
    unhardened 'guarded.o is compiled without -fcf-protection' -fcf-protection=none
    ;;
esac

exit $failed
