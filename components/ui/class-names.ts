/**
 * Class names joined by a space, without what is off.
 * @example classNames('a', false, 'b') // 'a b'
 */
export const classNames = (...names: readonly (string | false | null | undefined)[]): string =>
  names.filter(Boolean).join(' ')
