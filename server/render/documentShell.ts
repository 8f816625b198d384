import { html, type Markup, type Part } from './html.ts';

export interface DocumentParts {
  readonly title: string;
  readonly style: Part;
  readonly body: Part;
}

/** A whole HTML document: no script, nothing loaded from outside, light and dark. */
export function documentShell({ title, style, body }: DocumentParts): Markup {
  return html`<!DOCTYPE html>
    <html lang="en">
      <head>
        <meta charset="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <meta name="color-scheme" content="light dark" />
        <title>${title}</title>
        <style>
          ${style}
        </style>
      </head>
      <body>
        ${body}
      </body>
    </html> `;
}
