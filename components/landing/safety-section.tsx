import { ButtonLink } from '@/components/ui/button-link'

/** Who decides, and the way in. */
export function SafetySection() {
  return (
    <section
      aria-labelledby="safety"
      className="mt-16 grid gap-x-12 gap-y-8 border-t-[3px] border-copper pt-8 lg:mt-24 lg:grid-cols-[minmax(0,6fr)_minmax(0,5fr)] lg:pt-12"
    >
      <div>
        <h2 id="safety" className="text-2xl">
          The program advises, the licensed person decides
        </h2>
        <p className="mt-3 max-w-reading">
          A score says where to look first. It does not say that a home is safe. Codes come from the
          inspector, a computed check is a prompt to look, and what must be done is set by the law and the
          rules of the place, not by a screen.
        </p>
        <p className="mt-3 max-w-reading font-semibold">
          Smoke, fire, a shock or a burning smell: get out, call 999, and do not go back in.
        </p>
      </div>
      <div className="lg:justify-self-end">
        <p className="text-lg">No telephone call, no training. Bring the list you have.</p>
        <div className="mt-4 flex flex-wrap gap-3">
          <ButtonLink href="/sign-up" size="thumb">
            Start a register
          </ButtonLink>
          <ButtonLink href="/sign-in" kind="secondary" size="thumb">
            Sign in
          </ButtonLink>
        </div>
      </div>
    </section>
  )
}
