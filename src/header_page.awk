# header_page.awk - makes the manual page of a public header: awk -v date=DATE -f header_page.awk HEADER >PAGE
#
# SPDX-License-Identifier: MIT
#
# The headers are the documentation of the library; this puts them into mdoc(7). What it relies on:
#   - the first comment behind the licence is "bluecone/NAME.h - what it is", then blank line, then prose;
#   - a comment stands directly above what it explains; a comment at the end of a line explains that line;
#   - text indented by two columns or more is a list of parameters ("   name   what it is") or a formula.
# A line that it cannot place ends the run with 1 and the line: nothing is left out silently.

# ---- text ---------------------------------------------------------------------------------------------
function trim(s) { sub(/^[ \t]+/, "", s); sub(/[ \t]+$/, "", s); return s }

# Characters that roff would take for its own.
function plain(s) {
    gsub(/\\/, "\\e", s)
    gsub(/\^/, "\\(ha", s)
    gsub(/~/, "\\(ti", s)
    if (s ~ /^[.']/) s = "\\&" s
    return s
}
function verbatim(s) { s = plain(s); gsub(/'/, "\\(aq", s); return s }

# Prose: other headers become their pages, names of the library bold, words in backticks italic.
function prose(s,   out, word) {
    s = plain(s)
    out = ""
    while (match(s, /bluecone\/[a-z0-9_]+\.h|bluecone-[a-z]+\([0-9]\)|bc_[a-z0-9_]+|BC_[A-Z0-9_]+|`[^`]*`/)) {
        word = substr(s, RSTART, RLENGTH)
        out = out substr(s, 1, RSTART - 1)
        s = substr(s, RSTART + RLENGTH)
        if (word ~ /^bluecone\//) {
            sub(/^bluecone\//, "", word)
            sub(/\.h$/, "", word)
            out = out "\\fBbluecone_" word "\\fR(3)"
        } else if (word ~ /^bluecone-/)
            out = out "\\fB" substr(word, 1, length(word) - 3) "\\fR" substr(word, length(word) - 2)
        else if (word ~ /^`/)
            out = out "\\fI" substr(word, 2, length(word) - 2) "\\fR"
        else
            out = out "\\fB" word "\\fR"
    }
    out = out s
    while (match(out, /[a-z] - 1([ ,:;.)]|$)/)) # "0..count - 1" is one word
        out = substr(out, 1, RSTART) "\\ -\\ 1" substr(out, RSTART + 5)
    if (out ~ /^[.']/) out = "\\&" out
    return out
}

# Prose with every sentence on a line of its own, as mdoc wants it; a point of an abbreviation ends none.
function sentences(s,   out, head, word) {
    out = ""
    while (match(s, /[A-Za-z0-9)\]"'%`]\. +[A-Z`]/)) {
        head = substr(s, 1, RSTART + 1)
        s = substr(s, RSTART + RLENGTH - 1)
        word = head
        sub(/\.$/, "", word)
        sub(/^.*[ (]/, "", word)
        if (word ~ /^[0-9]+$/ && s ~ /^BImSchV/ || word ~ /^([A-Z]|al|[A-Z][a-z]|Chem|Eng|Progress|Phys|Ref|Res|Int|Combust|Trans|Math)$/)
            out = out prose(head) "\\& "
        else
            out = out prose(head) "\n"
    }
    return out prose(s)
}

# An argument of a macro, quoted.
function quoted(s) { s = plain(s); gsub(/"/, "\\(dq", s); return "\"" s "\"" }

function emit(s) { body = body s "\n" }

# The list is a compact one: what shares one text stands together, with a blank line in front of it.
function begin_group() { if (body != "") emit(".Pp") }

# ---- comments -----------------------------------------------------------------------------------------
# comment[1..comments]: the lines of the comment that waits for what it explains, without the stars.
function take_comment(line,   last) {
    sub(/^ *\/\* ?/, "", line)
    comments = 0
    do {
        last = line ~ /\*\//
        sub(/ *\*\/.*$/, "", line)
        comment[++comments] = line
        if (last) break
        if ((getline line) <= 0) fail("a comment without end")
        sub(/^ *\* ?/, "", line)
    } while (1)
}

function indent_of(s) { match(s, /^ */); return RLENGTH }

# True when lines from..to are parameters: "   name, name   text", continued farther in.
function are_parameters(from, to,   i, first) {
    first = indent_of(comment[from])
    for (i = from; i <= to; i++)
        if (indent_of(comment[i]) <= first && comment[i] !~ /^ +[a-z_][a-z0-9_]*(, [a-z_][a-z0-9_]*)*  +[^ =]/)
            return 0
    return 1
}

function emit_parameters(from, to,   i, first, s, tag, wide) {
    first = indent_of(comment[from])
    wide = "Ds"
    for (i = from; i <= to; i++)
        if (indent_of(comment[i]) <= first) {
            match(trim(comment[i]), /  +/)
            if (RSTART - 1 > length(wide) && RSTART <= 15) wide = substr(trim(comment[i]), 1, RSTART - 1)
        }
    gsub(/ /, "n", wide)
    emit(".Bl -tag -width " wide " -compact")
    for (i = from; i <= to; i++) {
        s = trim(comment[i])
        if (indent_of(comment[i]) <= first) {
            match(s, /  +/)
            tag = substr(s, 1, RSTART - 1)
            s = substr(s, RSTART + RLENGTH)
            gsub(/, /, " , ", tag)
            emit(".It Fa " tag)
        }
        emit(sentences(s))
    }
    emit(".El")
}

# Formulas that stand on one line, two blanks apart, and do not fit a screen go on lines of their own.
function emit_formula(from, to,   i, first, s) {
    first = indent_of(comment[from])
    emit(".Bd -literal -offset 2n")
    for (i = from; i <= to; i++) {
        s = substr(comment[i], first + 1)
        if (length(s) > 64) gsub(/,  +/, ",\n", s)
        emit(verbatim(s))
    }
    emit(".Ed")
}

# Writes the waiting comment, from a line on, as the text of an item.
function emit_comment(from,   i, j, begun, parted) {
    begun = 0
    parted = 0
    for (i = from; i <= comments; i++) {
        if (trim(comment[i]) == "") {
            parted = 1
        } else if (indent_of(comment[i]) >= 2) {
            for (j = i; j < comments && indent_of(comment[j + 1]) >= 2; j++) { }
            if (are_parameters(i, j)) {
                if (begun) emit(".Pp")
                emit_parameters(i, j)
            } else
                emit_formula(i, j)
            i = j
            begun = 1
            parted = 1
        } else {
            if (begun && parted && comment[i] !~ /^[,;]/) emit(".Pp")
            emit(sentences(comment[i]))
            begun = 1
            parted = 0
        }
    }
    comments = 0
}

# The comment that ends a line of code: code_part and note; a comment may go on over lines.
function split_line(line,   at, more) {
    note = ""
    at = index(line, "/*")
    if (at == 0) {
        code_part = trim(line)
        return
    }
    code_part = trim(substr(line, 1, at - 1))
    note = substr(line, at + 2)
    while (note !~ /\*\//) {
        if ((getline more) <= 0) fail("a comment without end")
        sub(/^ *\*? ?/, "", more)
        note = note " " trim(more)
    }
    at = index(note, "*/")
    if (trim(substr(note, at + 2)) != "") fail("code behind a comment")
    note = trim(substr(note, 1, at - 1))
}

function emit_note() {
    if (note != "") emit(sentences(note))
}

# ---- declarations -------------------------------------------------------------------------------------
function fail(why) {
    print FILENAME ":" FNR ": " why ": " $0 >"/dev/stderr"
    failed = 1
    exit 1
}

# A block of #define lines.
function take_constants(line,   name, value, first) {
    first = 1
    begin_group()
    do {
        split_line(line)
        sub(/^#define +/, "", code_part)
        match(code_part, /^[A-Z0-9_]+/)
        name = substr(code_part, 1, RLENGTH)
        value = trim(substr(code_part, RLENGTH + 1))
        value = plain(value)
        gsub(/"/, "\\(dq", value)
        emit(".It Dv " name " No = " value)
        if (first && comments > 0) emit_comment(1)
        emit_note()
        first = 0
        if ((getline line) <= 0) break
    } while (line ~ /^#define /)
    if (line != "") fail_line(line)
}

function fail_line(line) { $0 = line; fail("not understood") }

# typedef enum or struct, on one line or many; the name stands behind the brace.
function take_members(line,   head, rows, row, i, tag, names, values) {
    head = line
    begin_group()
    sub(/ *\{.*/, "", head)
    if (line ~ /\}/) {
        match(line, /\{.*\}/)
        values = trim(substr(line, RSTART + 1, RLENGTH - 2))
        names = trim(substr(line, RSTART + RLENGTH))
        sub(/;.*/, "", names)
        emit(".It Vt " names)
        if (comments > 0) {
            emit_comment(1)
            emit(".Pp")
        }
        values = "," values
        gsub(/, */, "\n.It Dv ", values)
        emit(".Bl -tag -width Ds -compact" values "\n.El")
        return
    }
    rows = 0
    while ((getline line) > 0 && line !~ /^\}/) {
        split_line(line)
        if (code_part == "") fail_line(line)
        row = code_part
        sub(/[;,]$/, "", row)
        tag = head ~ /enum/ ? ".It Dv " plain(row) : ".It Li " quoted(row)
        # What "BC_OK = 0," is worth is part of the interface.
        sub(/ = /, " No = ", tag)
        member[++rows] = tag
        member_note[rows] = note
    }
    names = line
    sub(/^\} */, "", names)
    sub(/;.*/, "", names)
    emit(".It Vt " names)
    if (comments > 0) {
        emit_comment(1)
        emit(".Pp")
    }
    emit(".Bl -tag -width Ds -compact")
    for (i = 1; i <= rows; i++) {
        emit(member[i])
        if (member_note[i] != "") emit(sentences(member_note[i]))
    }
    emit(".El")
}

# Splits at commas outside of brackets into argument[1..]; returns how many.
function split_arguments(s,   i, c, depth, n, from) {
    depth = 0
    n = 0
    from = 1
    for (i = 1; i <= length(s); i++) {
        c = substr(s, i, 1)
        if (c == "(") depth++
        if (c == ")") depth--
        if (c == "," && depth == 0) {
            argument[++n] = trim(substr(s, from, i - from))
            from = i + 1
        }
    }
    argument[++n] = trim(substr(s, from))
    return n
}

# The name that an argument declares.
function argument_name(s) {
    if (match(s, /\(\*[a-z_]+\)/)) return substr(s, RSTART + 2, RLENGTH - 3)
    sub(/\[.*/, "", s)
    match(s, /[a-z_0-9]+$/)
    return substr(s, RSTART)
}

# One prototype: into the synopsis, and as a tag of the item at hand.
function take_prototype(line,   more, at, name, type, n, i, tag) {
    while (line !~ /;$/) {
        if ((getline more) <= 0) fail("a prototype without end")
        line = line " " trim(more)
    }
    gsub(/BC_API |BC_MUST_USE /, "", line)
    if (!match(line, /[a-z_0-9]+\(/)) fail_line(line)
    name = substr(line, RSTART, RLENGTH - 1)
    type = trim(substr(line, 1, RSTART - 1))
    if (type ~ /bc_status$/) can_fail = 1
    at = RSTART + RLENGTH
    n = split_arguments(substr(line, at, length(line) - at - 1))
    functions[++function_count] = name
    synopsis = synopsis ".Ft " quoted(type) "\n.Fo " name "\n"
    tag = ".It Fn " name
    for (i = 1; i <= n; i++) {
        synopsis = synopsis ".Fa " quoted(argument[i]) "\n"
        tag = tag " " (argument[i] == "void" ? "void" : argument_name(argument[i]))
    }
    synopsis = synopsis ".Fc\n"
    emit(tag)
}

function take_prototypes(line) {
    begin_group()
    do {
        take_prototype(line)
        if ((getline line) <= 0) line = ""
    } while (line ~ /^BC_API /)
    if (comments == 0) fail(functions[function_count] " is not explained")
    emit_comment(1)
    if (line ~ /^#define /) take_constants(line)
    else if (line != "") fail_line(line)
}

# "typedef struct bc_log bc_log;", "typedef double bc_objective(const bc_gas *gas, void *context);"
function take_alias(line,   name) {
    begin_group()
    name = line
    sub(/^typedef /, "", name)
    sub(/;$/, "", name)
    if (name ~ /^struct /) sub(/^.* /, "", name)
    emit(".It Vt " quoted(name))
    if (comments > 0) emit_comment(1)
}

# ---- the page -----------------------------------------------------------------------------------------
function take_opening(   i, title) {
    title = comment[1]
    page = title
    sub(/^bluecone\//, "", page)
    sub(/\.h - .*/, "", page)
    sub(/^[^-]* - /, "", title)
    for (i = 2; i <= comments && trim(comment[i]) != ""; i++)
        title = title " " trim(comment[i])
    sub(/\.$/, "", title)
    what = title
    body = ""
    emit_comment(i + 1)
    opening = body
    body = ""
    opened = 1
}

/^\/\* SPDX/ { next }
/^\/\*/ {
    if (comments > 0) {
        if (opened) fail("a comment that explains nothing")
        fail("two opening comments")
    }
    take_comment($0)
    if (!opened) take_opening()
    next
}
/^#if defined/ { while ($0 !~ /^#endif/) getline; next } # what compilers call the marks of a prototype
/^#ifdef __cplusplus/ { while ($0 !~ /^#endif/) getline; next }
/^#include "bluecone\// {
    gsub(/#include "bluecone\/|\.h"/, "")
    see[++see_count] = $0
    next
}
/^#ifndef|^#endif|^#include </ { next }
/^#define BLUECONE_[A-Z0-9_]+_H$/ { next }
/^#define / { take_constants($0); next }
/^typedef (enum|struct) \{/ { take_members($0); next }
/^typedef / { take_alias($0); next }
/^BC_API / { take_prototypes($0); next }
/^$/ { if (comments > 0) fail("a comment that explains nothing"); next }
{ fail("not understood") }

END {
    if (failed) exit 1
    name = "bluecone_" page
    print ".\\\" SPDX-License-Identifier: MIT"
    print ".\\\" Made from include/bluecone/" page ".h by header_page.awk: change the header."
    print ".Dd " date
    print ".Dt " toupper(name) " 3"
    print ".Os bluecone"
    print ".Sh NAME"
    print ".Nm " name (function_count ? " ," : "")
    for (i = 1; i <= function_count; i++)
        print ".Nm " functions[i] (i < function_count ? " ," : "")
    print ".Nd " plain(what)
    print ".Sh LIBRARY"
    print "libbluecone"
    print ".Pq Fl lbluecone ; No see Xr bluecone 3 for how to compile and link"
    print ".Sh SYNOPSIS"
    print ".In bluecone/" page ".h"
    printf "%s", synopsis
    print ".Sh DESCRIPTION"
    printf "%s", opening
    if (opening != "") print ".Pp"
    if (body != "") print ".Bl -tag -width Ds -compact"
    printf "%s", body
    if (body != "") print ".El"
    if (can_fail) {
        print ".Sh RETURN VALUES"
        print "A function that returns"
        print ".Vt bc_status"
        print "returns"
        print ".Dv BC_OK"
        print "when it did what it says."
        print "Otherwise it has written none of its outputs, unless it says so above, and where"
        print ".Fa err"
        print "is not"
        print ".Dv NULL"
        print "it tells cause and remedy there:"
        print (page == "status" ? "as above." : ".Xr bluecone_status 3 .")
    }
    print ".Sh SEE ALSO"
    printf ".Xr bluecone 3"
    for (i = 1; i <= see_count; i++)
        printf " ,\n.Xr bluecone_%s 3", see[i]
    print ""
}
