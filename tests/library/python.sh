# shellcheck shell=bash
# SPDX-License-Identifier: MIT
# python.sh - sourced: a Python that can load the library as it was built.
#
# A library under AddressSanitizer wants the runtime of that in front of all others, which only a program linked
# with it has; and Python keeps what it does not free at its end.

# use_python FOLDER_OF_THE_LIBRARY FOLDER: where needed, a python3 that preloads the runtime comes first in PATH.
use_python() {
    local real
    nm -D "$1/libbluecone.so.0" | grep -q __asan_init || return 0
    real=$(command -v python3)
    mkdir -p "$2"
    printf '#!/bin/sh\nLD_PRELOAD=%s ASAN_OPTIONS=detect_leaks=0 exec %s "$@"\n' \
        "$("${CC:-gcc}" -print-file-name=libasan.so)" "$real" >"$2/python3"
    chmod +x "$2/python3"
    PATH=$2:$PATH
}
