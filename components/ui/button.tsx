import { type ComponentProps } from 'react'
import { buttonClass, type ButtonKind, type ButtonSize } from './button-class'

type Props = ComponentProps<'button'> & { kind?: ButtonKind; size?: ButtonSize }

/** A button that does not send a form unless `type="submit"` is given; see SubmitButton for one that shows that it waits. */
export function Button({ kind, size, className, type = 'button', ...rest }: Props) {
  return <button type={type} className={buttonClass(kind, size, className)} {...rest} />
}
