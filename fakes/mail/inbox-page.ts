/** The mailbox as two plain pages, for a person who tries the program out. */
import { type Letter } from './mailbox'

const MARKS: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' }

const safe = (text: string) => text.replace(/[&<>"']/g, (mark) => MARKS[mark] ?? mark)

const STYLE = `
  :root { color-scheme: light dark }
  body { font: 1rem/1.5 system-ui, sans-serif; max-width: 52rem; margin: 2rem auto; padding: 0 1rem }
  table { border-collapse: collapse; width: 100% }
  th, td { text-align: left; padding: .5rem .75rem .5rem 0; border-bottom: 1px solid #8886; vertical-align: top }
  iframe { width: 100%; height: 34rem; border: 1px solid #8886; background: #fff }
  pre { white-space: pre-wrap; overflow-wrap: anywhere }
  dl { display: grid; grid-template-columns: auto 1fr; gap: .25rem 1rem }
  dt { font-weight: 600 }
  dd { margin: 0; overflow-wrap: anywhere }`

const page = (title: string, body: string) => `<!doctype html>
<html lang="en-GB"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width, initial-scale=1">
<title>${safe(title)}</title><style>${STYLE}</style></head><body><main>${body}</main></body></html>`

const when = (letter: Letter) =>
  new Date(letter.receivedAt).toLocaleString('en-GB', {
    timeZone: 'Europe/London',
    dateStyle: 'medium',
    timeStyle: 'short',
  })

/** The list of letters. Nothing here has left this machine, and the page says so. */
export function inboxPage(letters: readonly Letter[]): string {
  const rows = letters.map(
    (letter) => `<tr><td>${when(letter)}</td><td>${safe(letter.to.join(', '))}</td>
      <td><a href="/messages/${safe(letter.id)}">${safe(letter.subject)}</a></td></tr>`,
  )
  const list = rows.length
    ? `<table><thead><tr><th scope="col">Came</th><th scope="col">To</th><th scope="col">Subject</th></tr></thead>
       <tbody>${rows.join('')}</tbody></table>`
    : '<p>No letters yet. Invite somebody, or ask for a new password, and look again.</p>'
  return page(
    'Letters',
    `<h1>Letters</h1><p>E-mail from the demo ends here. None of it leaves this machine.</p>${list}`,
  )
}

/** One letter: who, what, every link to follow, and the letter as its reader sees it. */
export function letterPage(letter: Letter): string {
  const links = letter.links.map((link) => `<dd><a href="${safe(link)}">${safe(link)}</a></dd>`).join('')
  const body = letter.html
    ? `<iframe title="The letter" sandbox="allow-popups allow-popups-to-escape-sandbox" srcdoc="${safe(`<base target="_blank">${letter.html}`)}"></iframe>`
    : ''
  return page(
    letter.subject,
    `<p><a href="/">All letters</a></p><h1>${safe(letter.subject)}</h1>
     <dl><dt>Came</dt><dd>${when(letter)}</dd><dt>From</dt><dd>${safe(letter.from)}</dd>
     <dt>To</dt><dd>${safe(letter.to.join(', '))}</dd>${links && `<dt>Links</dt>${links}`}</dl>
     ${body}<h2>As plain text</h2><pre>${safe(letter.text)}</pre>`,
  )
}
