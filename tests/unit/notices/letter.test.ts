import { expect, it } from 'vitest'
import { letterBodies } from '@/lib/notices/letter'

it('says the same in both bodies, and lets no name become markup', () => {
  const { text, html } = letterBodies({
    paragraphs: ['Pat <script>alert(1)</script> & Co asks you to join.'],
    link: { text: 'Join', href: 'https://fuseward.example/accept-invitation/abc?a=1&b="2"' },
    closing: ['Bye.'],
  })
  expect(text).toBe(
    'Pat <script>alert(1)</script> & Co asks you to join.\n\nJoin:\nhttps://fuseward.example/accept-invitation/abc?a=1&b="2"\n\nBye.\n',
  )
  expect(html).toContain('Pat &lt;script&gt;alert(1)&lt;/script&gt; &amp; Co asks you to join.')
  expect(html).toContain('href="https://fuseward.example/accept-invitation/abc?a=1&amp;b=&quot;2&quot;"')
  expect(html).not.toContain('<script')
})
