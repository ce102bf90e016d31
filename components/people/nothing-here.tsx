import { ButtonLink } from '@/components/ui/button-link'
import { PageHeader } from '@/components/ui/page-header'

/** What is said of what is not there and of what is not this person's to see: the two look alike. */
export function NothingHere() {
  return (
    <>
      <PageHeader
        title="This page was not found"
        sub="There is nothing at this address, or it is not part of what you work with."
      />
      <ButtonLink href="/">Go to the start</ButtonLink>
    </>
  )
}
