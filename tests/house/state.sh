#!/bin/sh
# The library holds no writable object. Constant tables of pointers (.data.rel.ro) are written by the
# loader only and do not count; nor do the counters of sanitizers and coverage.
set -eu

nm --format=sysv "$OUT/libbluecone.a" | tr -d ' ' | awk -F '|' '
/^.*\.o:$|\[.*\.o\]:$/ { object = $0 }
$3 ~ /^[BbDdCGgSs]$/ && $7 !~ /^\.data\.rel\.ro/ && $1 !~ /^(__asan|__odr_asan|__ubsan|__gcov|__llvm|\.?LASAN)/ {
    print "state: writable object " $1 " (" $7 ") in " object
    bad = 1
}
END { exit bad }'
