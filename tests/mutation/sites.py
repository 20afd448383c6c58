# SPDX-License-Identifier: MIT
"""Where a C source can be changed so that its tests should notice, and how.

A mutant is (line, column, start, end, operator, new text) over the text of one file. Comments, strings,
preprocessor lines and static assertions are never touched, nor are two kinds of number that no test can see:
the size in a declaration of an array, and the 0 of {0}, which only says "all zero".
"""
import re

SWAPS = {
    "+": "-", "-": "+", "*": "/", "/": "*", "+=": "-=", "-=": "+=", "*=": "/=", "/=": "*=",
    "<": "<=", "<=": "<", ">": ">=", ">=": ">", "==": "!=", "!=": "==", "&&": "||", "||": "&&",
}
ARITHMETIC = {"+", "-", "*", "/"}
ASSIGNMENTS = {"=", "+=", "-=", "*=", "/=", "|=", "&=", "^=", "<<=", ">>="}
RETURNS = {"BC_OK": "BC_ERR_RANGE", "true": "false", "false": "true"}

HIDDEN = re.compile(
    r'/\*.*?\*/|//[^\n]*'                       # comments
    r'|"(?:\\.|[^"\\\n])*"|\'(?:\\.|[^\'\\\n])*\''  # texts, characters
    r'|^[ \t]*#(?:[^\n]*\\\n)*[^\n]*'           # preprocessor lines, continued ones too
    r'|\bstatic_assert\s*\([^;]*;',
    re.S | re.M)
TOKEN = re.compile(
    r'(?P<number>(?:0[xX][0-9a-fA-F]+|(?:\d+\.?\d*|\.\d+)(?:[eE][-+]?\d+)?)[a-zA-Z]*)'
    r'|(?P<name>[A-Za-z_]\w*)'
    r'|(?P<sign><<=|>>=|->|\+\+|--|<<|>>|<=|>=|==|!=|&&|\|\||[-+*/%&|^]=|[^\s\w])')


def mask(text):
    """The text with all that is never touched made blank; a string keeps its quotes, as it is an operand."""
    def blank(match):
        kept = match.group()
        if kept[0] in "\"'":
            return kept[0] + " " * (len(kept) - 2) + kept[0]
        return re.sub(r"[^\n]", " ", kept)
    return HIDDEN.sub(blank, text)


def tokens_of(masked):
    return [(m.lastgroup, m.group(), m.start(), m.end()) for m in TOKEN.finditer(masked)]


def closing(tokens, i):
    """The index of the bracket that closes the one at i."""
    depth = 0
    for j in range(i, len(tokens)):
        depth += {"(": 1, ")": -1}.get(tokens[j][1], 0)
        if depth == 0:
            return j
    return i


def scaled(number):
    """A constant with a point is scaled by 1.01, an integer grows by one, zero becomes one."""
    digits, suffix = re.fullmatch(r"(0[xX][0-9a-fA-F]+|[0-9.]+(?:[eE][-+]?\d+)?)([a-zA-Z]*)", number).groups()
    if re.fullmatch(r"\d+|0[xX].*", digits):
        return f"{int(digits, 0) + 1}{suffix}"
    value = float(digits)
    return (repr(value * 1.01) if value else "1.0") + suffix


def in_declared_array(tokens, i):
    """True for a number between the brackets of `type name[..]`."""
    while i > 0 and tokens[i][1] != "[":
        if tokens[i][1] in ";{}=":
            return False
        i -= 1
    i -= 1
    while i > 0 and tokens[i][1] == "]":  # name[A][B]
        while i > 0 and tokens[i][1] != "[":
            i -= 1
        i -= 1
    if i < 1 or tokens[i][0] != "name":
        return False
    before = tokens[i - 1]
    if before[1] == "*":  # a pointer, not a product: no blank behind the star
        return before[3] == tokens[i][2] and i > 1 and tokens[i - 2][0] == "name"
    return before[0] == "name" and before[1] not in ("return", "case", "else", "sizeof")


def of_sign(masked, tokens, i):
    """Operators stand between blanks in this house; what does not is a pointer or a sign."""
    _, sign, start, end = tokens[i]
    if sign not in SWAPS or masked[start - 1] != " " or masked[end] not in " \n":
        return
    if sign in ARITHMETIC and (i == 0 or not (tokens[i - 1][0] in ("number", "name") or tokens[i - 1][1] in ")]")):
        return
    yield start, end, "operator", SWAPS[sign]


def of_number(tokens, i):
    _, number, start, end = tokens[i]
    if in_declared_array(tokens, i):
        return
    if number == "0" and tokens[i - 1][1] == "{" and tokens[i + 1][1] == "}":
        return
    yield start, end, "constant", scaled(number)


def of_condition(text, tokens, i):
    if tokens[i][1] not in ("if", "while") or tokens[i + 1][1] != "(":
        return
    start, end = tokens[i + 1][2], tokens[closing(tokens, i + 1)][3]
    yield start, end, "condition", f"(!{text[start:end]})"


def of_return(tokens, i):
    if tokens[i][1] == "return" and tokens[i + 1][1] in RETURNS and tokens[i + 2][1] == ";":
        yield tokens[i + 1][2], tokens[i + 1][3], "return", RETURNS[tokens[i + 1][1]]


def of_assignment(masked, tokens, i):
    """A statement `name.member[..] = ...;` is deleted; one that declares is not."""
    if i == 0 or tokens[i - 1][1] not in ";{})" and tokens[i - 1][1] != "else":
        return
    j = i + (tokens[i][1] == "*")
    if tokens[j][0] != "name":
        return
    j += 1
    while tokens[j][1] in (".", "->", "["):
        if tokens[j][1] == "[":
            depth = 1
            while depth:
                j += 1
                depth += {"[": 1, "]": -1}.get(tokens[j][1], 0)
            j += 1
        else:
            j += 2
    if tokens[j][1] not in ASSIGNMENTS:
        return
    start, end = tokens[i][2], masked.index(";", tokens[j][2])
    if "{" not in masked[start:end]:
        yield start, end, "deletion", ""


def mutants_of(text):
    """Every mutant of a file, in the order of the text."""
    masked = mask(text)
    tokens = tokens_of(masked)
    found = []
    for i, (kind, word, _, _) in enumerate(tokens[:-3]):
        if kind == "sign":
            found += of_sign(masked, tokens, i)
        elif kind == "number":
            found += of_number(tokens, i)
        else:
            found += of_condition(text, tokens, i)
            found += of_return(tokens, i)
        if kind == "name" or word == "*":
            found += of_assignment(masked, tokens, i)
    for start, end, operator, new in found:
        line = text.count("\n", 0, start) + 1
        column = start - text.rfind("\n", 0, start)
        yield line, column, start, end, operator, new
