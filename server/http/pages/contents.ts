import { limitsOfUse } from '../../render/closing.ts';
import { html, type Part } from '../../render/html.ts';
import { type Line, padSection } from '../../render/section.ts';
import type { OwnFunctions } from '../../engine/ownFunctions.ts';
import type { Workbook } from '../../workbook/model.ts';
import type { Serving } from '../serving.ts';
import { documentOf } from './document.ts';

/** The list of sheets: where each is, what it is about, how many outputs it has. */
export function contentsPage({ workbooks, ownFunctions }: Serving): string {
  return documentOf({
    title: 'Evenkeel: calculation sheets',
    about:
      'Each is worked when it is opened. Change what is given on the sheet itself; the file of the workbook stays as it is.',
    top: null,
    content: [
      padSection('sheets', 'Sheets', [...workbooks].map(sheetLine)),
      ownFunctions === null ? null : ownSection(ownFunctions),
      limitsOfUse(),
    ],
  });
}

function sheetLine([name, { title, about, outputs }]: [string, Workbook]): Line {
  return {
    reference: html`<span class="code">${name}</span>`,
    calculation: html`<h3><a href="/sheets/${encodeURIComponent(name)}">${title}</a></h3>
      <p>${about}</p>`,
    output: outputs.length === 1 ? '1 output' : `${outputs.length} outputs`,
  };
}

function ownSection({ file, sha256, functions }: OwnFunctions): Part {
  return padSection('own-functions', 'Own functions', [
    {
      reference: html`<span class="code">${file}</span>`,
      calculation: functions.map(({ name, summary }) => html`<p><code>${name}</code> ${summary}</p>`),
      output: html`<p class="quiet">SHA-256</p>
        <p class="code">${sha256}</p>`,
    },
  ]);
}
