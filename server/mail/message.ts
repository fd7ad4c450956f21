/** A letter ready to send. */
export interface Message {
  readonly to: string;
  readonly subject: string;
  readonly text: string;
  readonly html: string;
  readonly links: string[];
}

export interface Letter {
  readonly to: string;
  readonly subject: string;
  /** Paragraphs before the link; plain text, whoever wrote it. */
  readonly before: readonly string[];
  readonly link: { readonly label: string; readonly url: string };
  readonly after: readonly string[];
}

const entities: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };
const escaped = (text: string) => text.replace(/[&<>"']/g, (character) => entities[character]);
const paragraph = (html: string) => `<p style="margin:0 0 16px">${html}</p>`;

/** The same words as plain text and as HTML; what people typed is escaped. */
export function writeLetter({ to, subject, before, link, after }: Letter): Message {
  const text = [...before, `${link.label}:\n${link.url}`, ...after, 'Kerbline'].join('\n\n');
  const body = [
    ...before.map((line) => paragraph(escaped(line))),
    paragraph(`<a href="${escaped(link.url)}">${escaped(link.label)}</a>`),
    ...after.map((line) => paragraph(escaped(line))),
    paragraph('Kerbline'),
  ].join('\n');
  const html = `<!doctype html>\n<html lang="en"><body style="font:16px/1.5 sans-serif;max-width:34em">\n${body}\n</body></html>\n`;
  return { to, subject, text, html, links: [link.url] };
}
