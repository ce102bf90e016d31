import Link from 'next/link'
import { type ComponentProps } from 'react'
import { buttonClass, type ButtonKind, type ButtonSize } from './button-class'

type Props = ComponentProps<typeof Link> & { kind?: ButtonKind; size?: ButtonSize }

/** A link that looks like a button: it goes somewhere, and changes nothing. */
export function ButtonLink({ kind, size, className, ...rest }: Props) {
  return <Link className={buttonClass(kind, size, className)} {...rest} />
}
