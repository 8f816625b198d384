/** More of a text does not help to find it. */
const LONGEST_SHOWN = 60;

/** A text of the person's for a message, its end left out where it is long. */
export function shown(text: string): string {
  return text.length > LONGEST_SHOWN ? `${text.slice(0, LONGEST_SHOWN)}...` : text;
}
