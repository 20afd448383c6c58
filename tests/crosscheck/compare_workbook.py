#!/usr/bin/env python3
# SPDX-License-Identifier: MIT
"""compare_workbook.py - compares the numbers of a workbook, read with openpyxl, with those of --json.

Usage: compare_workbook.py BOOK.xlsx BOOK.json NAME

JSON has 12 significant digits, so numbers must agree to 1e-11; no cell may hold a formula."""
import json
import sys

from openpyxl import load_workbook

TOLERANCE = 1e-11


def close(a, b):
    return isinstance(a, (int, float)) and abs(a - b) <= TOLERANCE * max(abs(a), abs(b))


def rows_of(sheet):
    return [[cell.value for cell in row] for row in sheet.iter_rows()]


def columns_of(head, name):
    """Where the value and the uncertainty of a gas stand, under heads as 'Value', 'B: name' or 'new: name'."""
    if name is None:
        return head.index("Value"), head.index("u (k = 1)")
    for i, text in enumerate(head):
        if text and text.partition(": ")[2] == name:
            return i, i + 1
    return None


def figures_of(book, names):
    """All figures: (id, gas or None, unit, value, uncertainty)."""
    found = []
    for sheet in book:
        head = None
        for row in rows_of(sheet):
            if row[0] == "Figure":
                head = row
                continue
            if head is None or row[0] is None:
                continue
            for gas in [None] if "Value" in head else range(len(names)):
                at = columns_of(head, None if gas is None else names[gas])
                if at and row[at[0]] is not None:
                    found.append((row[head.index("Id")], gas, row[head.index("Unit")], row[at[0]], row[at[1]]))
    return found


def check_results(book, report):
    names = [gas["name"] for gas in report["gases"]]
    figures = figures_of(book, names)
    bad = 0
    for result in report["results"]:
        gas = names.index(result["gas"]) if len(names) > 1 and result["gas"] is not None else None
        unit = None if result["unit"] == "1" else result["unit"]
        fit = [f for f in figures if f[:3] == (result["id"], gas, unit) and close(f[3], result["value"])]
        u = result["uncertainty"]
        if not any((u is None and f[4] is None) or (u is not None and close(f[4], u)) for f in fit):
            print(f"  {result['id']} of {result['gas']}: {result['value']} {result['unit']}, u {u}: not in the workbook")
            bad += 1
    if len(figures) != len(report["results"]):
        print(f"  {len(figures)} figures, {len(report['results'])} in JSON")
        bad += 1
    return bad


def is_table(rows, table):
    heads = [column["heading"] or column["id"] for column in table["columns"]]
    units = any(column["unit"] for column in table["columns"])
    body = rows[2 if units else 1:]
    if not rows or rows[0][:len(heads)] != heads or len(body) != len(table["rows"]):
        return False
    return all(close(cell, want) if isinstance(want, (int, float)) else cell in (None, "", "-") if want is None else (cell or "") == want
               for got, row in zip(body, table["rows"]) for cell, want in zip(got, row))


def check_charts(book, report):
    """A command may draw a chart only where it is seen: then JSON has none, and its numbers are a table."""
    if "charts" not in report:
        return 0
    charts = [sheet for sheet in book if sheet._charts]
    if len(charts) != len(report["charts"]):
        print(f"  {len(charts)} native charts, {len(report['charts'])} in JSON")
        return 1
    bad = 0
    for sheet, chart in zip(charts, report["charts"]):
        cells = rows_of(sheet)[3:]
        columns = list(zip(*cells))
        for series in chart["series"]:
            want = [point[1] for point in series["points"]]
            if not any(len(c) >= len(want) and all(close(a, b) for a, b in zip(c, want)) for c in columns):
                print(f"  {chart['title']}: {series['label']} is not there")
                bad += 1
    return bad


def main():
    book = load_workbook(sys.argv[1])
    with open(sys.argv[2], encoding="utf-8") as file:
        report = json.load(file)
    bad = check_results(book, report) + check_charts(book, report)
    for table in report["tables"]:
        if not any(is_table(rows_of(sheet), table) for sheet in book):
            print(f"  the table '{table['title']}' is not in the workbook")
            bad += 1
    formulas = sum(cell.data_type == "f" for sheet in book for row in sheet.iter_rows() for cell in row)
    if formulas or book.properties.creator:
        print(f"  {formulas} formulas, creator {book.properties.creator}")
        bad += 1
    print(f"workbook of '{sys.argv[3]}': {len(book.sheetnames)} sheets, {len(report['results'])} figures, "
          f"{len(report['tables'])} tables, {bad} differences")
    return 1 if bad else 0


if __name__ == "__main__":
    sys.exit(main())
