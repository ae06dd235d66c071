const escape = (text: string): string =>
  text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;').replaceAll('"', '&quot;')

/** A mail in words: what is asked of the reader comes first. */
export interface MailContent {
  readonly event: string
  readonly subject: string
  /** The one thing the reader should do. */
  readonly action: string
  readonly lines: readonly string[]
  readonly link: { readonly title: string; readonly path: string }
}

const oneLine = (text: string): string => text.replaceAll(/\s+/g, ' ').trim()

/** The mail as plain text, which reads alone, and as HTML. Files are never attached: the link opens the place. */
export const composeMail = (
  content: MailContent,
  address: string,
): { event: string; subject: string; text: string; html: string } => {
  const href = new URL(content.link.path, address).href
  const paragraphs = [content.action, ...content.lines]
  return {
    event: content.event,
    subject: oneLine(content.subject).slice(0, 180),
    text: `${paragraphs.join('\n\n')}\n\n${content.link.title}: ${href}\n`,
    html:
      '<!doctype html><html lang="en"><meta charset="utf-8"><body style="font:15px/1.6 sans-serif;color:#1d2b33">' +
      paragraphs
        .map((text, index) => (index === 0 ? `<p><strong>${escape(text)}</strong></p>` : `<p>${escape(text)}</p>`))
        .join('') +
      `<p><a href="${escape(href)}">${escape(content.link.title)}</a></p></body></html>`,
  }
}
