import { classNames } from '@/components/ui/class-names'

/** The note that stands under every page: what the program is, and who decides. `flush`: what stands above draws the line. */
export function Footer({ flush }: { flush?: boolean }) {
  return (
    <footer className={classNames('print:mt-6', !flush && 'mt-16 border-t border-line')}>
      <div className="page-width flex flex-wrap items-baseline justify-between gap-x-10 gap-y-2 py-6 text-sm text-slate">
        <p className="max-w-reading">
          Fuseward advises. Codes come from the inspector; a computed check is a prompt to look. What is safe
          is for a licensed electrician to decide, under the law and the rules of the place. If there is
          smoke, fire or shock: get out and call 999.
        </p>
      </div>
    </footer>
  )
}
