/** The page's whole style, as text that can stand between style tags of HTML and of XML. */
import type { WorkbookIdentity } from '../../evaluation.ts';
import { verbatim, type Markup } from '../html.ts';
import { revisionOf } from '../titleBlock.ts';
import { COLUMNS } from './columns.ts';
import { INK } from './ink.ts';
import { NARROW } from './narrow.ts';
import { PICTURE } from './picture.ts';
import { PRINT } from './print.ts';
import { SHEET } from './sheet.ts';

export function stylesheet(workbook: WorkbookIdentity): Markup {
  return verbatim([INK, SHEET, COLUMNS, PICTURE, NARROW, PRINT, runningHead(workbook)].join('\n'));
}

/** Job, revision and page number on every printed page, so that loose pages can be put together again. */
function runningHead({ title, sha256 }: WorkbookIdentity): string {
  return `@page {
  @top-left { content: ${cssText(title)}; }
  @top-right { content: ${cssText(`revision ${revisionOf(sha256)}`)}; }
  @bottom-right { content: 'page ' counter(page) ' of ' counter(pages); }
}`;
}

/** Any text as a CSS string: everything but letters, digits and spaces is written by its code point. */
function cssText(text: string): string {
  const safe = text.replace(/[^\p{L}\p{N} ]/gu, (sign) => `\\${(sign.codePointAt(0) ?? 0).toString(16)} `);
  return `'${safe}'`;
}
