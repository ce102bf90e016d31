import { classNames } from './class-names'

export type ButtonKind = 'primary' | 'secondary' | 'quiet' | 'danger'
/** `compact` stays above the 24 px target; `regular` is 40 px; `thumb` 48 px, for tenants and electricians. */
export type ButtonSize = 'compact' | 'regular' | 'thumb'

const KINDS: Record<ButtonKind, string> = {
  primary: 'border-copper bg-copper text-on-copper hover:border-copper-deep hover:bg-copper-deep',
  secondary: 'border-copper bg-surface text-copper hover:bg-copper-wash',
  quiet: 'border-transparent text-copper hover:bg-copper-wash',
  danger: 'border-madder bg-madder text-on-madder hover:border-madder-deep hover:bg-madder-deep',
}
const SIZES: Record<ButtonSize, string> = {
  compact: 'min-h-8 px-2.5 py-1 text-sm',
  regular: 'min-h-control px-4 py-2 text-base',
  thumb: 'min-h-thumb px-5 py-3 text-lg',
}

/** The look of a button, shared by buttons, links that look like one, and menu triggers. */
export const buttonClass = (
  kind: ButtonKind = 'primary',
  size: ButtonSize = 'regular',
  extra?: string,
): string =>
  classNames(
    'no-print inline-flex items-center justify-center gap-2 rounded-control border text-center font-semibold no-underline transition-colors',
    'disabled:border-line disabled:bg-sunken disabled:text-slate aria-disabled:opacity-70',
    KINDS[kind],
    SIZES[size],
    extra,
  )
