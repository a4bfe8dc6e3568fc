"""What can be changed in a header: one token at a time, comments, texts and preprocessor lines left alone."""

import collections
import re
from dataclasses import dataclass

TOKEN = re.compile(
    r"""(?P<comment>//[^\n]*|/\*.*?\*/)
      | (?P<text>R"\((?:.|\n)*?\)"|"(?:\\.|[^"\\\n])*"|'(?:\\.|[^'\\\n])*')
      | (?P<hash>^[ ]*\#[^\n]*)
      | (?P<number>0[xX][0-9a-fA-F.]+(?:[pP][+-]?\d+)?|\.?\d[\d']*(?:\.\d*)?(?:[eE][+-]?\d+)?)(?P<suffix>[A-Za-z]*)
      | (?P<word>[A-Za-z_]\w*)
      | (?P<sign><=>|<<=|>>=|->|::|\.\.\.|\+\+|--|&&|\|\||[-+*/<>=!]=|<<|>>|[-+*/<>=!&|%~^?:;,.(){}\[\]])""",
    re.VERBOSE | re.MULTILINE | re.DOTALL,
)

# What each sign is taken for instead; only where blanks on both sides say that it stands between two terms.
BETWEEN = {
    "+": ("sign", ["-"]),
    "-": ("sign", ["+"]),
    "*": ("factor", ["/"]),
    "/": ("factor", ["*"]),
    "+=": ("sign", ["-="]),
    "-=": ("sign", ["+="]),
    "*=": ("factor", ["/="]),
    "/=": ("factor", ["*="]),
    "<": ("comparison", ["<=", ">"]),
    "<=": ("comparison", ["<", ">="]),
    ">": ("comparison", [">=", "<"]),
    ">=": ("comparison", [">", "<="]),
    "==": ("comparison", ["!="]),
    "!=": ("comparison", ["=="]),
    "&&": ("condition", ["||"]),
    "||": ("condition", ["&&"]),
}

# Words of which the other is the likely mistake.
OTHER = {
    "near": "far", "far": "near", "min": "max", "max": "min", "true": "false", "false": "true",
    "just_left": "just_right", "just_right": "just_left", "lower_bound": "upper_bound", "upper_bound": "lower_bound",
    "from": "to", "to": "from", "front": "back", "back": "front", "first": "last", "last": "first",
    "before": "after", "after": "before", "left_end": "right_end", "right_end": "left_end",
}


@dataclass(frozen=True)
class mutant:
    header: str      # below include/sagitta
    line: int
    column: int
    kind: str
    old: str
    new: str
    begin: int       # in the text of the header
    source: str      # the line, without blanks at its ends
    occurrence: int  # 1, or more where the same line stands in the header again

    @property
    def key(self):
        """What stays the same while lines above move: which token of which line, and what becomes of it."""
        again = f" ({self.occurrence})" if self.occurrence > 1 else ""
        return f"{self.header} | {self.source} | {self.column} | {self.old} -> {self.new or 'nothing'}{again}"

    def applied_to(self, text):
        return text[: self.begin] + self.new + text[self.begin + len(self.old):]


def other_numbers(number, is_row):
    """A number as it might be mistyped. In the table of formulas also with the other sign."""
    if re.fullmatch(r"\d+", number):
        return [str(int(number) + 1)] + ([f"-{number}"] if is_row and number != "0" else [])
    if number.lower().startswith("0x"):
        digit = re.search(r"[0-9a-fA-F](?=[pP]|$)", number)
        changed = "0" if digit.group().lower() == "f" else format(int(digit.group(), 16) + 1, "x")
        return [number[: digit.start()] + changed + number[digit.end():]]
    # A decimal: its first digit that is not 0 becomes the next one (5e-3 -> 6e-3, 0.5 -> 0.6); 0.0 becomes 1.0.
    digit = re.search(r"[1-9]", number.lower().split("e")[0])
    if digit is None:
        return ["1" + number[1:]]
    changed = "1" if digit.group() == "9" else str(int(digit.group()) + 1)
    return [number[: digit.start()] + changed + number[digit.end():]]


def mutants_of(header, text):
    """All mutants of a header, in the order of its text."""
    found = []
    seen = collections.Counter()
    for match in TOKEN.finditer(text):
        kind = match.lastgroup if match.lastgroup != "suffix" else "number"
        begin, end = match.span(kind)
        token = text[begin:end]
        line_begin = text.rfind("\n", 0, begin) + 1
        line_end = text.find("\n", end)
        source = text[line_begin:line_end]
        if source.lstrip().startswith("static_assert"):
            continue  # a guard for the compiler: tests/compile_fail holds those

        def add(what, new):
            # The column counts from the first character of the line that is no blank: it survives a reformat.
            column = begin - line_begin - (len(source) - len(source.lstrip()))
            seen[source, column, new] += 1
            found.append(mutant(header, text.count("\n", 0, begin) + 1, column, what, token, new, begin,
                                source.strip(), seen[source, column, new]))

        if kind == "number":
            is_row = "shape<" in source and header == "detail/influence.hpp"
            for new in other_numbers(token, is_row):
                add("coefficient" if is_row else "constant", new)
        elif kind == "sign":
            is_between = text[begin - 1] in " \n" and text[end] in " \n"
            if is_between and token in BETWEEN:
                what, others = BETWEEN[token]
                for new in others:
                    add(what, new)
            elif token == "-" and text[begin - 1] in " (,<{" and not text[end].isspace():
                # The sign in front of a term; what stands before it is apart already.
                add("coefficient" if header == "detail/influence.hpp" else "sign", "")
            elif token == "!" and text[end] != "=":
                add("condition", "")
        elif kind == "word" and token in OTHER:
            is_declared = re.search(r"[\w&>] $", text[:begin][-3:]) and not re.search(r"return $", text[:begin][-7:])
            if not is_declared:
                add("word", OTHER[token])
    return found
