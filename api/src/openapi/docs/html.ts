/** A piece of a page that may stand as it is. */
export class Html {
  constructor(readonly text: string) {}
}

type Piece = Html | string | number | readonly Html[];

/** Writes HTML: what is put in is escaped, unless it is HTML already. */
export function html(parts: TemplateStringsArray, ...pieces: readonly Piece[]): Html {
  return new Html(parts.reduce((all, part, index) => all + written(pieces[index - 1] ?? '') + part));
}

export const nothing = new Html('');

function written(piece: Piece): string {
  if (piece instanceof Html) return piece.text;
  if (typeof piece === 'string' || typeof piece === 'number') return escaped(String(piece));
  return piece.map(({ text }) => text).join('');
}

const signs: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};
const escaped = (text: string): string => text.replace(/[&<>"']/g, (sign) => signs[sign] ?? sign);

/** A text with its code in backticks as code, and an empty line as a new paragraph. */
export function prose(text: string): Html {
  const paragraphs = text.split('\n\n').map((paragraph) => {
    const pieces = paragraph
      .split('`')
      .map((piece, index) => (index % 2 === 1 ? html`<code>${piece}</code>` : html`${piece}`));
    return html`<p>${pieces}</p>`;
  });
  return html`${paragraphs}`;
}
