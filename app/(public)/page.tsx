import { type Metadata } from 'next'
import { AnswersSection } from '@/components/landing/answers-section'
import { PeopleSection } from '@/components/landing/people-section'
import { SafetySection } from '@/components/landing/safety-section'
import { StepsSection } from '@/components/landing/steps-section'
import { Street } from '@/components/drawings/street'
import { ButtonLink } from '@/components/ui/button-link'

export const metadata: Metadata = {
  title: { absolute: 'Fuseward: the electrical-risk register for rented homes' },
}

export default function LandingPage() {
  return (
    <>
      <section
        aria-labelledby="question"
        className="pt-10 pb-8 sm:pt-16 lg:grid lg:grid-cols-[minmax(0,7fr)_minmax(0,5fr)] lg:items-end lg:gap-12 lg:pb-12"
      >
        <h1 id="question" className="max-w-[17ch] text-hero tracking-[-0.03em]">
          Which of your homes is likeliest to hurt somebody?
        </h1>
        <div className="mt-6 lg:mt-0">
          <p className="max-w-reading text-lg">
            Fuseward is a register of what protects each home you let: rewireable fuses, circuit breakers, RCD
            cover. It says which home to see first and why, and whose inspection report lapses when.
          </p>
          <div className="mt-6 flex flex-wrap items-center gap-3">
            <ButtonLink href="/sign-up" size="thumb">
              Start a register
            </ButtonLink>
            <ButtonLink href="/sign-in" kind="secondary" size="thumb">
              Sign in
            </ButtonLink>
          </div>
        </div>
      </section>
      <section aria-labelledby="street">
        <h2 id="street" className="sr-only">
          What is on the wall, worst to best
        </h2>
        <Street />
      </section>
      <AnswersSection />
      <PeopleSection />
      <StepsSection />
      <SafetySection />
    </>
  )
}
