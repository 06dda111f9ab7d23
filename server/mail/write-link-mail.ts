interface LinkMail {
  /** Each a paragraph, before the link. */
  readonly before: readonly string[];
  /** Words of the link, where it has some. */
  readonly linkText: string;
  readonly link: string;
  readonly after: readonly string[];
}

const ESCAPES: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };

/** Text as it stands in HTML, in an attribute too. */
const escapeHtml = (text: string): string => text.replace(/[&<>"']/g, (letter) => ESCAPES[letter]!);

const paragraph = (html: string): string => `<p>${html}</p>`;

/** A short mail about one link, as text and as HTML that says the same. Names that people typed are escaped. */
export function writeLinkMail({ before, linkText, link, after }: LinkMail): { text: string; html: string } {
  return {
    text: `${[...before, link, ...after].join('\n\n')}\n`,
    html: [
      ...before.map((line) => paragraph(escapeHtml(line))),
      paragraph(`<a href="${escapeHtml(link)}">${escapeHtml(linkText)}</a>`),
      ...after.map((line) => paragraph(escapeHtml(line))),
    ].join('\n'),
  };
}
