/** What a reader sees of a piece of the page. */
export function words(markup: string): string {
  return markup
    .replace(/<style>[^]*<\/style>/, '')
    .replace(/<\/?(?:span|wbr|data|strong|sup|a|code)\b[^>]*>/g, '')
    .replace(/<[^>]+>/g, ' ')
    .replace(/&#160;/g, ' ')
    .replace(/&quot;/g, '"')
    .replace(/&#39;/g, "'")
    .replace(/&lt;/g, '<')
    .replace(/&gt;/g, '>')
    .replace(/&amp;/g, '&')
    .replace(/\s+/g, ' ');
}

/** One section of the page. */
export function part(page: string, id: string): string {
  return new RegExp(`<section id="${id}"[^]*?</section>`).exec(page)?.[0] ?? '';
}

/** One step of the page. */
export function stepOf(page: string, number: string): string {
  return (
    new RegExp(`<article[^>]*id="step-${number.replace('.', '-')}"[^]*?</article>`).exec(page)?.[0] ?? ''
  );
}
