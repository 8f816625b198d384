/** What to write instead of a character that means nothing in a formula. */

const REPLACEMENTS: Readonly<Record<string, string>> = {
  '−': 'Write the plain minus sign -.',
  '–': 'Write the plain minus sign -.',
  '×': 'Write * to multiply.',
  '·': 'Write * to multiply.',
  '÷': 'Write / to divide.',
  '≤': 'Write <=.',
  '≥': 'Write >=.',
  '≠': 'Write <>.',
  '“': 'Write text in plain double quotes ".',
  '”': 'Write text in plain double quotes ".',
  '‘': 'Write text in plain double quotes ".',
  '’': 'Write text in plain double quotes ".',
  ';': 'Separate arguments by commas; a semicolon separates the rows inside { }.',
  '@': 'Leave it out.',
  '[': 'Write a cell or a range by its address, such as B4:B7, or by a name of the workbook.',
  '!': 'A sheet before ! is followed by a cell: Kettle!B4. "Not equal" is written <>.',
  $: 'A $ stands before the letters or the digits of a cell: $B$4.',
  '#': 'An array answer is read by its whole range, such as E3:E7.',
};

/** What a token of unknown kind begins with, in quotes, and help with it. */
export function characterHelp(text: string): { character: string; help: string } {
  const [first = ''] = text;
  const character = first === '"' || first === "'" ? first : `"${first}"`;
  if (first === '"') return { character, help: 'Close the text with ", and double a " inside it.' };
  if (first === "'") {
    return { character, help: "Text stands in double quotes; single quotes name a sheet: 'Feed tank'!B4." };
  }
  if (/^\p{N}/u.test(text)) {
    return { character: `"${text}"`, help: 'Write a sign such as * between a number and what follows.' };
  }
  const help = Object.hasOwn(REPLACEMENTS, first) ? REPLACEMENTS[first] : undefined;
  return { character, help: help ?? 'Take it out, or put text in double quotes.' };
}
