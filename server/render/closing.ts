/** The last sections: what the sheet may be used for, and what worked it. */
import { html, type Markup } from './html.ts';
import type { Page } from './page.ts';
import { row, section } from './section.ts';

const LIMITS_OF_USE = [
  'The results hold for the equations, data and conditions that the workbook states, and for equilibrium: they say nothing of how fast it is reached.',
  'Where pressure, heat, toxic or flammable gas, or dosing is involved, they are one input to the judgement of a qualified person and not a design. Local codes, the law and licensed practice come first.',
  'A sheet is not checked until somebody other than its author has signed its title block.',
];

export function limitsOfUse(): Markup {
  const calculation = LIMITS_OF_USE.map((sentence) => html`<p>${sentence}</p>`);
  return section('limits-of-use', 'Limits of use', row({ reference: null, calculation, output: null }));
}

export function versions({ evaluation }: Page): Markup {
  const { versions: worked, workbook, instant } = evaluation;
  const facts = [
    ['Evenkeel', worked.evenkeel],
    ['HyperFormula', worked.hyperformula],
    ['Node.js', worked.node],
    ['workbook, SHA-256', workbook.sha256],
    ...(worked.ownFunctions === null
      ? []
      : [[`own functions ${worked.ownFunctions.file}, SHA-256`, worked.ownFunctions.sha256]]),
    ...(instant === null ? [] : [['NOW and TODAY stood for', instant]]),
  ];
  const calculation = html`<table class="facts">
    <caption>
      Equal versions and an equal workbook give equal results, bit for bit.
    </caption>
    <tbody>
      ${facts.map(
        ([what, which]) =>
          html`<tr>
            <th scope="row">${what ?? ''}</th>
            <td class="code">${which ?? ''}</td>
          </tr> `,
      )}
    </tbody>
  </table>`;
  return section('versions', 'Worked with', row({ reference: null, calculation, output: null }));
}
