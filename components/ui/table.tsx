import { type ComponentProps, type ReactNode } from 'react'
import { classNames } from './class-names'
import { ScrollRegion } from './scroll-region'

type Props = {
  /** names the table, and the region that scrolls on a narrow screen */
  caption: string
  /** the caption is shown above the table, not only read out */
  showCaption?: boolean
  children: ReactNode
  className?: string
}

/** A table: `<thead><Row><HeadCell/>…` and `<tbody><Row><Cell/>…`. The heading row stays in sight. */
export function Table({ caption, showCaption, children, className }: Props) {
  return (
    <ScrollRegion label={caption} className="border border-line bg-surface">
      <table className={classNames('w-full border-collapse text-left', className)}>
        <caption className={showCaption ? 'px-4 pt-4 pb-2 text-left font-semibold' : 'sr-only'}>
          {caption}
        </caption>
        {children}
      </table>
    </ScrollRegion>
  )
}

type HeadProps = ComponentProps<'th'> & { numeric?: boolean; sorted?: 'ascending' | 'descending' }

/** A column's heading. `numeric` ranges it right, as the figures under it; the unit belongs in the words. */
export function HeadCell({ numeric, sorted, className, ...rest }: HeadProps) {
  return (
    <th
      scope="col"
      aria-sort={sorted}
      className={classNames(
        'sticky top-0 z-10 bg-surface px-3 py-2.5 text-sm font-semibold text-slate shadow-[inset_0_-1px_0_var(--line)]',
        numeric && 'text-right',
        className,
      )}
      {...rest}
    />
  )
}

/** A row, set off by a line. */
export function Row({ className, ...rest }: ComponentProps<'tr'>) {
  return <tr className={classNames('border-b border-line last:border-b-0', className)} {...rest} />
}

/** A row's own heading, its first cell. */
export function RowHead({ className, ...rest }: ComponentProps<'th'>) {
  return (
    <th scope="row" className={classNames('px-3 py-2.5 align-middle font-semibold', className)} {...rest} />
  )
}

type CellProps = ComponentProps<'td'> & { numeric?: boolean }

/** A cell. `numeric` sets figures right, in columns of digits. */
export function Cell({ numeric, className, ...rest }: CellProps) {
  return (
    <td
      className={classNames('px-3 py-2.5 align-middle', numeric && 'text-right tabular-nums', className)}
      {...rest}
    />
  )
}
