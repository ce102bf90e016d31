import { type Fields } from './fields-of'

const SECRET = /password|secret/i

/**
 * What may go back to the person's form: text, but no password and no file.
 * @example typedValues({ email: 'a@b.example', password: 'x' }) // { email: 'a@b.example' }
 */
export function typedValues(fields: Fields): Record<string, string | string[]> {
  const typed: Record<string, string | string[]> = {}
  for (const [name, value] of Object.entries(fields)) {
    if (SECRET.test(name)) continue
    const texts = (Array.isArray(value) ? value : [value]).filter((one) => typeof one === 'string')
    if (texts.length) typed[name] = Array.isArray(value) ? texts : texts[0]!
  }
  return typed
}
