/**
 * How a table of errors is kept: code, what it says, and how to mend it.
 *
 * A message reads `<says>. <remedy>`; words in braces are filled in, and the compiler checks that
 * each is given.
 */
export interface ErrorTemplate {
  readonly says: string;
  readonly remedy: string;
}

/** The words in braces of a template. */
type Placeholders<Text extends string> = Text extends `${string}{${infer Name}}${infer Rest}`
  ? Name | Placeholders<Rest>
  : never;

/** What a template needs to be filled in. */
export type Details<Template extends ErrorTemplate> = Record<
  Placeholders<Template['says'] | Template['remedy']>,
  string | number
>;

/** The message of a template, filled in. */
export function fillTemplate<Template extends ErrorTemplate>(
  { says, remedy }: Template,
  details: Details<Template>,
): string {
  return `${fill(says, details)}. ${fill(remedy, details)}`;
}

function fill(text: string, details: Record<string, string | number>): string {
  return text.replace(/\{(\w+)\}/g, (_, name: string) => String(details[name]));
}
