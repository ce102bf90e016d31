/** A short letter by e-mail: the same words as plain text and as HTML. */
export type Letter = {
  readonly paragraphs: readonly string[]
  readonly link?: { readonly text: string; readonly href: string }
  readonly closing?: readonly string[]
}

const SIGNS: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' }
const escaped = (text: string) => text.replace(/[&<>"']/g, (sign) => SIGNS[sign] ?? sign)
const paragraph = (text: string) => `<p style="margin:0 0 16px">${escaped(text)}</p>`

/**
 * Both bodies of a letter.
 * @example letterBodies({ paragraphs: ['Hello.'] }).text // 'Hello.\n'
 */
export function letterBodies({ paragraphs, link, closing = [] }: Letter): { text: string; html: string } {
  const text =
    [...paragraphs, ...(link ? [`${link.text}:\n${link.href}`] : []), ...closing].join('\n\n') + '\n'
  const button =
    link &&
    `<p style="margin:0 0 16px"><a href="${escaped(link.href)}" style="display:inline-block;padding:10px 18px;background:#9C4221;color:#ffffff;text-decoration:none;border-radius:4px">${escaped(link.text)}</a></p>` +
      `<p style="margin:0 0 16px;font-size:14px;word-break:break-all">${escaped(link.href)}</p>`
  const body = [...paragraphs.map(paragraph), button ?? '', ...closing.map(paragraph)].join('')
  const html = `<!doctype html><html lang="en-GB"><body style="font-family:sans-serif;font-size:16px;line-height:1.5;color:#1D1B20"><div style="max-width:560px">${body}</div></body></html>`
  return { text, html }
}
