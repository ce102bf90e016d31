/** The note that stands under every page: what the program is, and who decides. */
export function Footer() {
  return (
    <footer className="mt-16 border-t border-line print:mt-6">
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
