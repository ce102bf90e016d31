const STEPS = [
  {
    title: 'Hand in the list you have',
    what: 'A spreadsheet or a CSV, in any order of columns, with “c. 1935” and “rewireable??” in it. Fuseward guesses what each column means, and you put it right.',
  },
  {
    title: 'See what it understood',
    what: 'A dry run names every problem by row and column before anything is kept. Rows it cannot take come back as a file, each with the reason.',
  },
  {
    title: 'Start with the first home',
    what: 'The register ranks your homes, shows what is on each wall, and says which one fact, if you found it out, would tell you most.',
  },
] as const

/** How it works, as three posts on one wire. */
export function StepsSection() {
  return (
    <section aria-labelledby="steps" className="border-t border-line pt-12 lg:pt-16">
      <h2 id="steps" className="text-3xl sm:text-4xl">
        From a spreadsheet to a ranking
      </h2>
      <ol className="mt-10 lg:grid lg:grid-cols-3">
        {STEPS.map(({ title, what }, at) => (
          <li key={title} className="relative pb-10 pl-14 last:pb-0 lg:pt-16 lg:pr-10 lg:pb-0 lg:pl-0">
            {at < STEPS.length - 1 && (
              <svg
                viewBox="0 0 100 20"
                preserveAspectRatio="none"
                className="absolute top-2.5 left-5 hidden h-5 w-full lg:block"
                aria-hidden="true"
              >
                <path
                  d="M0 10C30 10 34 19 50 10S70 10 100 10"
                  className="fill-none stroke-copper"
                  strokeWidth="3"
                  vectorEffect="non-scaling-stroke"
                />
              </svg>
            )}
            {at < STEPS.length - 1 && (
              <span
                className="absolute top-5 bottom-0 left-[1.1875rem] w-[3px] bg-copper lg:hidden"
                aria-hidden="true"
              />
            )}
            <span
              aria-hidden="true"
              className="absolute top-0 left-0 grid size-10 place-items-center rounded-full border-[3px] border-verdigris bg-paper font-display text-lg font-bold"
            >
              {at + 1}
            </span>
            <h3 className="text-xl">{title}</h3>
            <p className="mt-2 max-w-reading text-slate">{what}</p>
          </li>
        ))}
      </ol>
    </section>
  )
}
