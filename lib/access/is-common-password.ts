import { COMMON_WORDS } from './common-passwords'

const LOOKS_LIKE: Record<string, string> = {
  '0': 'o',
  '1': 'i',
  '3': 'e',
  '4': 'a',
  '5': 's',
  '7': 't',
  '@': 'a',
  $: 's',
  '!': 'i',
}
const RUNS = [
  '01234567890123456789',
  'abcdefghijklmnopqrstuvwxyz',
  'qwertyuiop',
  'asdfghjkl',
  'zxcvbnm',
  '1q2w3e4r5t6y7u8i9o0p',
  '1qaz2wsx3edc4rfv5tgb6yhn7ujm',
]
const DATES = [
  /^(0?[1-9]|[12]\d|3[01])[-/.]?(0?[1-9]|1[0-2])[-/.]?(19|20)\d\d$/,
  /^(19|20)\d\d[-/.]?(0?[1-9]|1[0-2])[-/.]?(0?[1-9]|[12]\d|3[01])$/,
]
const BACKWARDS = RUNS.map((run) => [...run].reverse().join(''))

const letters = (text: string) => text.replace(/^[^a-z]+|[^a-z]+$/g, '')
const asLetters = (text: string) => [...text].map((one) => LOOKS_LIKE[one] ?? one).join('')

/** Whether a text is one short piece over and over: `aaaaaaaa`, `12121212`, `passpass`. */
function repeats(text: string): string | null {
  for (let length = 1; length <= 4 && length * 2 <= text.length; length += 1) {
    const piece = text.slice(0, length)
    if (piece.repeat(Math.ceil(text.length / length)).startsWith(text)) return piece
  }
  return null
}

/**
 * Whether a password is among those that are tried first: a common word, with whatever digits and signs around it or in
 * place of letters; a run of the keyboard or of the alphabet; a short piece over and over; a date.
 * @example isCommonPassword('P4ssw0rd!') // true
 * @example isCommonPassword('kettle-under-tuesday') // false
 */
export function isCommonPassword(password: string): boolean {
  const plain = password.toLowerCase().replace(/\s/g, '')
  const words = [
    letters(plain),
    letters(asLetters(letters(plain))),
    letters(asLetters(plain)),
    asLetters(plain).replace(/[^a-z]/g, ''),
  ]
  if (words.some((word) => COMMON_WORDS.has(word) || (word.length % 2 === 0 && word !== '' && twice(word))))
    return true
  if (repeats(plain)) return true
  if (DATES.some((date) => date.test(plain))) return true
  return [...RUNS, ...BACKWARDS].some((run) => run.includes(plain))
}

const twice = (word: string) => {
  const half = word.slice(0, word.length / 2)
  return half + half === word && COMMON_WORDS.has(half)
}
