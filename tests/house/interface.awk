# interface.awk - a C program that prints the binary interface of public headers: awk -f interface.awk HEADER... >PROGRAM.c
#
# SPDX-License-Identifier: MIT
#
# Constants and enumerators with their values, structures with size and alignment, members with their place, size and
# declaration, and prototypes as they are written: all that a program built earlier relies on.

function trim(s) { sub(/^[ \t]+/, "", s); sub(/[ \t]+$/, "", s); gsub(/[ \t]+/, " ", s); return s }

# The header without comments, one statement or directive a line.
function flatten(file,   line, text, at, end) {
    text = ""
    while ((getline line < file) > 0) {
        if (line ~ /^#/) {
            sub(/ *\/\*.*/, "", line)
            line = "\n" line "\n"
        }
        text = text " " line
    }
    close(file)
    while ((at = index(text, "/*")) > 0) {
        end = index(substr(text, at), "*/")
        text = substr(text, 1, at - 1) " " substr(text, at + end + 1)
    }
    return text
}

function say(format, arguments) { program = program "    printf(\"" format "\\n\"" (arguments == "" ? "" : ", " arguments) ");\n" }

function take_constant(line,   name) {
    sub(/^#define +/, "", line)
    match(line, /^[A-Z0-9_]+/)
    name = substr(line, 1, RLENGTH)
    if (name !~ /^BC_/ || name ~ /^BC_(API|MUST_USE|VERSION)$/) return
    say("constant " name " %.15g", "(double)(" name ")")
}

function take_enumerators(type, list,   n, part, i, name) {
    say("enum " type " %zu", "sizeof(" type ")")
    n = split(list, part, ",")
    for (i = 1; i <= n; i++) {
        name = trim(part[i])
        sub(/ *=.*/, "", name)
        if (name != "") say("  " name " %d", "(int)" name)
    }
}

# "const char *id, *label" declares two.
function take_members(type, list,   n, part, i, m, k, word, base, name, shown) {
    say("struct " type " %zu, alignment %zu", "sizeof(" type "), _Alignof(" type ")")
    n = split(list, part, ";")
    for (i = 1; i <= n; i++) {
        base = trim(part[i])
        if (base == "") continue
        m = split(base, word, ",")
        for (k = 1; k <= m; k++) {
            name = trim(word[k])
            if (k == 1) {
                match(name, /[*]*[a-z_0-9]+(\[[^]]*\])*$/)
                base = substr(name, 1, RSTART - 1)
                name = substr(name, RSTART)
            }
            shown = trim(base) " " name
            gsub(/[*]/, "", name)
            sub(/\[.*/, "", name)
            say("  %zu+%zu " shown, "offsetof(" type ", " name "), sizeof(((" type " *)0)->" name ")")
        }
    }
}

function take_statement(s,   type) {
    s = trim(s)
    if (s ~ /^typedef (struct|enum) *\{/) {
        type = s
        sub(/^.*\} */, "", type)
        if (s ~ /^typedef struct/) {
            sub(/^typedef struct *\{/, "", s); sub(/\}[^}]*$/, "", s)
            take_members(type, s)
        } else {
            sub(/^typedef enum *\{/, "", s); sub(/\}[^}]*$/, "", s)
            take_enumerators(type, s)
        }
    } else if (s ~ /^(BC_API|__attribute__|typedef)/) {
        gsub(/BC_API |BC_MUST_USE /, "", s)
        gsub(/"/, "\\\"", s)
        say(s)
    }
}

# Statements end at a semicolon outside of braces.
function take_line(line,   i, c, depth, from) {
    if (line ~ /^#define/) { take_constant(line); return }
    if (line ~ /^#/) return
    sub(/^ *extern "C" \{/, "", line)
    depth = 0
    from = 1
    for (i = 1; i <= length(line); i++) {
        c = substr(line, i, 1)
        if (c == "{") depth++
        if (c == "}") depth--
        if (c == ";" && depth == 0) {
            take_statement(substr(line, from, i - from))
            from = i + 1
        }
    }
}

BEGIN {
    print "#include <stddef.h>\n#include <stdio.h>"
    for (f = 1; f < ARGC; f++) {
        name = ARGV[f]
        sub(/^.*include\//, "", name)
        print "#include \"" name "\""
        say("# " name)
        n = split(flatten(ARGV[f]), row, "\n")
        for (r = 1; r <= n; r++) take_line(row[r])
    }
    print "\nint main(void)\n{\n" program "    return 0;\n}"
    exit 0
}
