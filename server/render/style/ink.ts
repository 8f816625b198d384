/**
 * Paper, ink and one accent: the green of a calculation pad's ruling.
 *
 * Contrast after WCAG 2.2: text at least 7 to 1, accent and quiet text at least 4.5 to 1, on both papers.
 */
export const INK = `:root {
  color-scheme: light dark;
  --paper: #fffefa;
  --ink: #1a1c1b;
  --quiet: #555b57;
  --accent: #17634a;
  --rule: #8fb3a3;
  --faint: #d5e2db;
}
@media (prefers-color-scheme: dark) {
  :root {
    --paper: #151917;
    --ink: #e6e9e5;
    --quiet: #a5ada7;
    --accent: #86cfb0;
    --rule: #4b6b5d;
    --faint: #2b3a33;
  }
}`;
