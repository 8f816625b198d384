import { createHash } from 'node:crypto';
import type { Response } from 'express';

/** Sends an HTML document under a policy that lets it use its own style and nothing else. */
export function sendPage(response: Response, document: string, status = 200): void {
  response
    .status(status)
    .type('html')
    .set('Content-Security-Policy', contentPolicy(document))
    .set('Cache-Control', 'no-store')
    .send(document);
}

/**
 * No script, no image, nothing from elsewhere. The digests of the document's own styles are taken after
 * every text of a workbook in it was escaped, so that they can only be the renderer's.
 */
function contentPolicy(document: string): string {
  const sheets = digests(document, /<style>([^<]*)<\/style>/g);
  const attributes = digests(document, / style="([^"]*)"/g);
  return [
    "default-src 'none'",
    `style-src-elem ${sheets}`,
    attributes === '' ? "style-src-attr 'none'" : `style-src-attr 'unsafe-hashes' ${attributes}`,
    "form-action 'self'",
    "base-uri 'none'",
    "frame-ancestors 'none'",
  ].join('; ');
}

function digests(document: string, style: RegExp): string {
  const found = new Set([...document.matchAll(style)].map(([, text = '']) => text));
  return [...found].map((text) => `'sha256-${createHash('sha256').update(text).digest('base64')}'`).join(' ');
}
