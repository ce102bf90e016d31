import { ButtonLink } from '@/components/ui/button-link'
import { PageHeader } from '@/components/ui/page-header'

const WORDS = {
  reset: {
    what: 'It was used already, or has run out. Ask for a new one, and it comes by e-mail.',
    href: '/forgotten-password',
    text: 'Ask for a new link',
  },
  invitation: {
    what: 'It was taken up or withdrawn, or has run out. Whoever invited you can send it again.',
    href: '/sign-in',
    text: 'Sign in',
  },
} as const

/** A link of a letter that leads nowhere any more, or never did: the two look alike. */
export function EndedLink({ kind }: { kind: keyof typeof WORDS }) {
  const { what, href, text } = WORDS[kind]
  return (
    <>
      <PageHeader title="This link works no longer" sub={what} />
      <ButtonLink href={href}>{text}</ButtonLink>
    </>
  )
}
