/** In a narrow window, or at high zoom, the three columns stand one below the other. */
export const NARROW = `@media (max-width: 46rem) {
  .title-block { grid-template-columns: minmax(0, 1fr); }
  .title-block dl { border-left: 0; border-top: 1px solid var(--ink); }
  .row, .pad tr { display: block; }
  .pad, .pad > tbody, .pad > tbody > tr > td { display: block; width: auto; }
  .pad > thead { display: none; }
  .pad table tr { display: table-row; }
  .row > *, .pad > tbody > tr > td { padding: 0.15rem 0; }
  .row > :nth-child(n + 2), .pad > tbody > tr > td:nth-child(n + 2) { border: 0; }
  .heading > p { display: none; }
  .row > :last-child, .pad > tbody > tr > td:last-child { border-left: 2px solid var(--rule); padding-left: 0.75rem; margin-block: 0.3rem; }
  .row > :empty { display: none; }
  .row, .pad > tbody > tr { padding-block: 0.5rem; }
  .row > :first-child > * { display: inline; margin-right: 0.6rem; }
  .pad > tbody > tr > td:first-child br { display: none; }
  .pad > tbody > tr > td:first-child > * { margin-right: 0.6rem; }
  .row.heading { padding-block: 1.2rem 0.4rem; }
  .facts, .amounts { display: block; overflow-x: auto; }
  .facts td { overflow-wrap: anywhere; }
}`;
