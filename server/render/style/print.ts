/** On A4 paper: always black on white, no table row and no picture cut, wide sheets across the page. */
export const PRINT = `@page { size: A4; margin: 18mm 15mm 16mm; font: 8.5pt Charter, 'Bitstream Charter', Cambria, Georgia, serif; }
@page across { size: A4 landscape; }
@media print {
  :root { color-scheme: light; --paper: #fff; --ink: #000; --quiet: #333; --accent: #000; --rule: #666; --faint: #bbb; }
  html { font-size: 9.5pt; }
  body { max-width: none; padding: 0; }
  main { --reference: 6.5rem; --output: 13rem; }
  a { text-decoration: none; }
  h2, h3, caption, .heading { break-after: avoid; }
  .pad > tbody > tr:first-child { break-before: avoid; }
  tr, figure, .facts, .amounts, .list, .equation, .status, .title-block, .row:not(.step) { break-inside: avoid; }
  p { orphans: 3; widows: 3; }
  .picture { max-width: 26rem; }
  .wide { overflow: visible; }
  #source:has(.across) { page: across; }
  .grid, .formulas { font-size: 0.8rem; }
  .grid th, .grid td { padding: 0.1rem 0.3rem; }
}`;
