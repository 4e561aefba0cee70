#include "cli/page/page_style.hpp"

namespace ringward::cli {

const char* page_style() {
  return R"css(
:root { color-scheme: light; }
* { box-sizing: border-box; }
body {
  margin: 0 auto; padding: 1.5rem 1rem 4rem; max-width: 46rem;
  font: 0.97rem/1.5 "Liberation Serif", Georgia, "Times New Roman", serif;
  color: #1a1a1a; background: #fff; overflow-wrap: break-word;
}
h1, h2, h3, h4, table, figcaption, .label, .boxed, nav {
  font-family: "Liberation Sans", Arial, Helvetica, sans-serif;
}
h1 { font-size: 1.55rem; line-height: 1.25; margin: 0 0 0.3rem; string-set: page-title content(); }
h2 { font-size: 1.2rem; margin: 2.4rem 0 0.6rem; padding-top: 0.5rem; border-top: 2px solid #1a1a1a; }
h3 { font-size: 1.02rem; margin: 1.6rem 0 0.4rem; }
h4 { font-size: 0.95rem; margin: 1.2rem 0 0.3rem; }
p, ul, ol, dl { margin: 0.5rem 0 0.8rem; }
ul, ol { padding-left: 1.4rem; }
li { margin: 0.25rem 0; }
a { color: #003f7f; }
code, pre { font: 0.82rem/1.45 "Liberation Mono", "DejaVu Sans Mono", monospace; }
pre {
  white-space: pre-wrap; overflow-wrap: anywhere; padding: 0.7rem 0.9rem;
  border: 1px solid #b5b5b5; background: #f7f7f5;
}
.wide { overflow-x: auto; margin: 1rem 0 1.3rem; }
.wide:focus-visible, input:focus-visible, a:focus-visible { outline: 3px solid #003f7f; outline-offset: 2px; }
table { border-collapse: collapse; width: 100%; font-size: 0.84rem; line-height: 1.35; }
table.shared { table-layout: fixed; min-width: 40rem; overflow-wrap: anywhere; }
.shared th, .shared td { padding-left: 0.3rem; padding-right: 0.3rem; }
caption { text-align: left; font-weight: bold; padding: 0 0 0.4rem; }
th, td { padding: 0.28rem 0.6rem; text-align: left; vertical-align: top; border-bottom: 1px solid #c9c9c9; }
thead th { border-bottom: 1.5px solid #1a1a1a; vertical-align: bottom; }
tbody th { font-weight: normal; }
th.number, td.number { text-align: right; font-variant-numeric: tabular-nums; white-space: nowrap; }
.unit { display: block; font-weight: normal; color: #4a4a4a; }
figure { margin: 1.2rem 0 1.5rem; }
figure svg { display: block; max-width: 100%; height: auto; }
figcaption { font-size: 0.86rem; padding-top: 0.4rem; color: #333; }
.missing { padding: 0.7rem 0.9rem; border: 1px dashed #6b6b6b; }
.boxed { border: 2px solid #1a1a1a; padding: 0.7rem 1rem; margin: 1rem 0 1.2rem; }
.boxed p { margin: 0.25rem 0; }
table.pairs { margin: 0.8rem 0 1.1rem; font-size: 0.9rem; }
.pairs th, .pairs td { border-bottom: 1px solid #e3e3e3; padding-left: 0; overflow-wrap: anywhere; }
.pairs th { width: 28%; color: #4a4a4a; overflow-wrap: normal; }
ol.contents { list-style: none; padding-left: 0; columns: 2; column-gap: 2rem; font-size: 0.9rem; }
.checklist { list-style: none; padding-left: 0; }
.checklist li { padding-left: 1.7rem; text-indent: -1.7rem; }
.checklist li::before {
  content: ""; display: inline-block; width: 0.75rem; height: 0.75rem; margin-right: 0.95rem;
  border: 1.2px solid #1a1a1a;
}
.formula { padding-left: 1.4rem; font-family: "Liberation Serif", Georgia, serif; font-style: italic; }
.slider { display: flex; flex-wrap: wrap; align-items: center; gap: 0.8rem; margin-top: 0.6rem; }
.slider[hidden] { display: none; }
.slider input { flex: 1 1 14rem; min-height: 1.6rem; }
@media (max-width: 30rem) {
  ol.contents { columns: 1; }
}
@page {
  size: A4; margin: 20mm 22mm 22mm 24mm;
  @bottom-left { content: string(page-title); font: 8pt "Liberation Sans", Arial, sans-serif; color: #4a4a4a; }
  @bottom-right {
    content: "Page " counter(page) " of " counter(pages);
    font: 8pt "Liberation Sans", Arial, sans-serif; color: #4a4a4a;
  }
}
@media print {
  body { padding: 0; max-width: none; font-size: 9.6pt; }
  h1, h2, h3, h4, caption { break-after: avoid; }
  h2 { margin-top: 1.6rem; }
  tr, figure, .boxed { break-inside: avoid; }
  thead { display: table-header-group; }
  .wide { overflow: visible; }
  table { font-size: 8.4pt; }
  table.shared { min-width: 0; }
  pre { font-size: 7.1pt; }
  p, li { orphans: 3; widows: 3; }
  .screen-only { display: none; }
  ol.contents a { color: inherit; text-decoration: none; }
  ol.contents a::after { content: " " target-counter(attr(href), page); color: #4a4a4a; }
}
)css";
}

}  // namespace ringward::cli
