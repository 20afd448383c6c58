/* SPDX-License-Identifier: MIT */
/* page_style.c - how a page looks on a screen, on a telephone and on A4.
 *
 * Contrasts after WCAG 2.1, at least 4.5 for text: ink 14.6, pale 6.3, blue 8.1, green 7.1, red 7.6,
 * amber 7.0 on their grounds. */
#include "output/page_internal.h"

/* Lines of CSS; a rule may go on in the next line. */
static const char *const RULES[] = {
    /* ---- paper and type ---- */
    ":root{--ink:#1c2733;--pale:#566472;--blue:#0f4c81;--line:#d5dde5;--soft:#f4f7fa}",
    "*{box-sizing:border-box}",
    "html{color-scheme:light;-webkit-text-size-adjust:100%;text-size-adjust:100%}",
    "body{margin:0 auto;max-width:62rem;padding:1.5rem 1.5rem 3rem;background:#fff;color:var(--ink);",
    "font:1rem/1.5 system-ui,-apple-system,\"Segoe UI\",Roboto,\"Helvetica Neue\",\"DejaVu Sans\",Arial,",
    "sans-serif;overflow-wrap:anywhere}",
    "h1{margin:0 0 1rem;padding-bottom:.6rem;border-bottom:3px solid var(--blue);color:var(--blue);",
    "font-size:1.7rem;line-height:1.2;font-weight:650;text-wrap:balance}",
    "h2{margin:0 0 .5rem;color:var(--blue);font-size:1.1rem;line-height:1.3;font-weight:650}",
    "section{margin-top:2rem}",
    "a{color:var(--blue)}",
    "a:focus-visible,.box:focus-visible{outline:2px solid var(--blue);outline-offset:2px}",
    "small,.note{color:var(--pale);font-size:.85rem}",
    ".note{margin:.4rem 0 0;padding-left:.6rem}",
    "ul{margin:0;padding-left:1.2rem}",
    "li{margin:.2rem 0}",

    /* ---- verdict and caution ---- */
    ".verdict,.caution{margin:0 0 1rem;padding:.7rem 1rem;border:1px solid;border-left-width:.5rem;",
    "border-radius:.25rem}",
    ".verdict{font-size:1.15rem}",
    ".verdict strong,.caution strong{margin-right:.5rem;padding:.1rem .5rem;border-radius:.2rem;color:#fff;",
    "font-size:.95rem;white-space:nowrap}",
    ".plain{background:#eef4fa;border-color:var(--blue)}.plain strong{background:var(--blue)}",
    ".verdict.yes{background:#e9f5ee;border-color:#17603a}.verdict.yes strong{background:#17603a}",
    ".verdict.no{background:#fdeeec;border-color:#9b1c1c}.verdict.no strong{background:#9b1c1c}",
    ".care,.caution{background:#fdf5e3;border-color:#7a4a00}.care strong,.caution strong{background:#7a4a00}",

    /* ---- facts and contents ---- */
    "dl{display:grid;grid-template-columns:max-content 1fr;gap:.35rem 1rem;margin:0}",
    "dt{color:var(--pale)}dd{margin:0}dd small{display:block}",
    "nav{margin-top:1rem;padding:.5rem 0;border:solid var(--line);border-width:1px 0;font-size:.85rem}",
    "nav ul{display:flex;flex-wrap:wrap;gap:.2rem 1.1rem;padding:0;list-style:none}",
    "nav li{margin:0}nav a{display:inline-block;padding:.15rem 0;text-decoration:none}",
    "nav a:hover{text-decoration:underline}",
    ".checks{padding:0;list-style:none}.checks li{display:flex;gap:.7rem}",
    ".checks b{flex:none;width:4.4rem}b.yes{color:#17603a}b.no{color:#9b1c1c}",

    /* ---- tables ---- */
    ".box{position:relative;overflow-x:auto;margin:0}",
    ".box+.box{margin-top:1rem}",
    "table{border-collapse:collapse;font-size:.9rem;line-height:1.35;font-variant-numeric:tabular-nums ",
    "lining-nums}",
    "caption{position:absolute;width:1px;height:1px;overflow:hidden;clip-path:inset(50%);white-space:nowrap}",
    "th,td{padding:.3rem .6rem;border-bottom:1px solid var(--line);text-align:left;vertical-align:top;",
    "font-weight:400}",
    "thead th{border-bottom:2px solid #9fb2c4;color:var(--pale);font-size:.8rem;vertical-align:bottom}",
    "thead th span{display:block;font-size:.75rem}",
    ".n{text-align:right;white-space:nowrap}th.n{white-space:normal}",
    ".n i{display:inline-block;font-style:normal;text-align:left}",
    ".n small{display:block;font-size:.78rem}",
    "td.m{color:var(--pale);font-size:.85rem}",
    ".figures table{width:100%;table-layout:fixed}",
    ".figures th:nth-child(1){width:42%}.figures th:nth-child(2){width:22%}.figures ",
    "th:nth-child(3){width:14%}",
    ".with-u th:nth-child(1){width:36%}.with-u th:nth-child(2){width:17%}.with-u th:nth-child(3){width:12%}",
    ".with-u th:nth-child(4){width:14%}",
    ".table table{min-width:min(100%,24rem)}",
    "th,td{overflow-wrap:break-word}.l{overflow-wrap:anywhere}.q{white-space:nowrap}",
    ".gases tbody th,.table tbody th{position:sticky;left:0;background:#fff}",
    "tbody tr:nth-child(even)>*{background:var(--soft)!important}",
    ".gases table{width:100%;table-layout:fixed;min-width:calc(25.6rem + var(--n)*7rem)}",
    ".gases th:nth-child(1){width:12rem}.gases th:nth-child(2){width:5.4rem}.gases th.m{width:8.2rem}",
    ".wide table{width:max-content}.table td{max-width:22rem}",

    /* ---- charts and foot ---- */
    "figure svg{display:block;width:100%;max-width:50rem;min-width:36rem;height:auto;margin:0 auto}",
    "footer{margin-top:2.5rem;padding-top:1rem;border-top:3px solid var(--blue);font-size:.85rem}",
    "footer h2{font-size:1rem}",

    /* ---- a telephone ---- */
    "@media (max-width:40rem){body{padding:1rem .75rem 2rem}h1{font-size:1.35rem}",
    "table{font-size:.85rem}th,td{padding:.3rem .3rem}dl{grid-template-columns:1fr;gap:0}",
    "dd{margin-bottom:.5rem}.table tbody th{max-width:8.5rem}.table td{padding:.3rem .5rem}",
    ".m{display:none}tbody th[data-method]::after{content:attr(data-method);display:block;color:var(--pale);",
    "font-size:.75rem}",
    ".figures th:nth-child(1){width:50%}.figures th:nth-child(2){width:30%}.figures ",
    "th:nth-child(3){width:20%}",
    ".with-u th:nth-child(1){width:34%}.with-u th:nth-child(2){width:26%}.with-u th:nth-child(3){width:18%}",
    ".with-u th:nth-child(4){width:22%}",
    ".gases table{min-width:calc(11rem + var(--n)*5.6rem)}.gases th:nth-child(1){width:7.2rem}",
    ".gases th:nth-child(2){width:4.2rem}.gases td{padding:.3rem .3rem}",
    ".gases .q{white-space:normal;overflow-wrap:anywhere}.verdict ",
    "strong{display:table;margin-bottom:.3rem}}",

    /* ---- A4; a table of many columns lies across ---- */
    "@page{size:A4;margin:16mm 15mm 18mm;@bottom-right{content:counter(page) \" / \" counter(pages);",
    "font:8pt sans-serif;color:#566472}}",
    "@page across{size:A4 landscape;margin:14mm}",
    "@media print{html{font-size:9.5pt}body{max-width:none;padding:0}nav{display:none}.box{overflow:visible}",
    "section,figure,.verdict,.caution,tr,li,footer{break-inside:avoid}h2{break-after:avoid}",
    "section:has(tr:nth-child(25),figure){break-inside:auto}",
    "section{margin-top:5mm}thead{display:table-header-group}.gases tbody th,.table tbody ",
    "th{position:static}",
    "th,td{padding:.8mm 1.5mm}figure svg{min-width:0;max-width:150mm}",
    ".gases table{min-width:0}.gases th:nth-child(1){width:9.5rem}.gases th:nth-child(2){width:4.8rem}",
    ".gases th.m{width:7rem}section:has(.wide,.many){page:across}.wide table{width:100%}",
    ".wide th,.wide td{padding:.5mm 1mm;font-size:6.5pt}tbody th.n{white-space:nowrap}",
    "a{color:inherit;text-decoration:none}",
    "*{-webkit-print-color-adjust:exact;print-color-adjust:exact}}",
};

void page_style(FILE *out)
{
    for (size_t i = 0; i < sizeof RULES / sizeof *RULES; i++)
        fprintf(out, "%s\n", RULES[i]);
    /* The point is narrower than a digit. */
    for (int i = 1; i <= PAGE_FRACTION_MAX; i++)
        fprintf(out, ".f%d{width:%d.5ch}%s", i, i - 1, i == PAGE_FRACTION_MAX ? "\n" : "");
}
