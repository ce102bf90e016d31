import { ButtonLink } from '@/components/ui/button-link'
import { PageHeader } from '@/components/ui/page-header'

export default function HomeNotFound() {
  return (
    <>
      <PageHeader
        title="That home was not found"
        sub="The link may be old, the home may lie in a patch that is not yours, or your role may not open that page."
      />
      <ButtonLink href="/homes">All homes</ButtonLink>
    </>
  )
}
