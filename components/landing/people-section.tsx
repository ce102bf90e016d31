const PEOPLE = [
  {
    figure: '3',
    unit: 'homes',
    who: 'A landlord',
    what: 'You have a folder of reports and a few dates in your head. Type the homes in, or hand in a list with hardly any columns. In ten minutes you know what is due and what you do not know.',
  },
  {
    figure: '100,000',
    unit: 'homes',
    who: 'A housing provider',
    what: 'You have spreadsheets with holes in them. Hand in the stock list as people keep it. Officers see their own patches, the compliance manager the whole, and the auditor that nothing was changed in silence.',
  },
  {
    figure: '1',
    unit: 'home at a time',
    who: 'An electrician',
    what: 'What you find on the wall is kept way by way, with the day you found it. Your codes are yours: the program never gives one, and never changes one.',
  },
] as const

/** For whom it is. */
export function PeopleSection() {
  return (
    <section aria-labelledby="people" className="border-t border-line pt-12 lg:pt-16">
      <h2 id="people" className="max-w-[22ch] text-3xl sm:text-4xl">
        The same register for three homes and for a hundred thousand
      </h2>
      <dl className="mt-8 lg:mt-10">
        {PEOPLE.map(({ figure, unit, who, what }) => (
          <div
            key={who}
            className="grid gap-x-12 gap-y-1 border-t border-line py-7 lg:grid-cols-[minmax(0,5fr)_minmax(0,6fr)] lg:py-9"
          >
            <dt className="contents">
              <span className="flex flex-wrap items-baseline gap-x-3 lg:row-span-2">
                <span className="font-display text-5xl font-bold tracking-tight text-copper lg:text-7xl">
                  {figure}
                </span>
                <span className="text-lg text-slate">{unit}</span>
              </span>
              <span className="font-display text-xl font-bold">{who}</span>
            </dt>
            <dd className="max-w-reading text-lg">{what}</dd>
          </div>
        ))}
      </dl>
    </section>
  )
}
