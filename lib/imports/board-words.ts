/** The trade's words for what is in a consumer unit, found in folded text. Words of the trade and of standards only. */

/** Longer names that hold a shorter one inside them are brought to one word first. */
const ONE_WORD: readonly (readonly [RegExp, string])[] = [
  [
    /\bresidual current (?:circuit )?breakers? with (?:integral )?over ?(?:load|current)(?: protection)?\b/g,
    'rcbo',
  ],
  [
    /\bresidual current (?:circuit )?breakers?\b|\bearth leakage (?:circuit )?breakers?\b|\bresidual current devices?\b/g,
    'rcd',
  ],
  [/\brccbs?\b|\belcbs?\b|\brcds\b|\b(?:bs ?(?:en ?)?)?61008\b/g, 'rcd'],
]

/**
 * Patterns of each kind of device.
 * @source BS 3036 semi-enclosed fuses; BS 1361, BS 88 cartridge fuses; BS 3871, BS EN 60898 circuit breakers;
 * BS EN 61009 RCBOs; the slang is common practice, no source
 */
const DEVICES = {
  rewireable:
    /\bre ?wr?ir?e{0,2}(?:a?ble|able|ible|abel|eable)s?\b|\b(?:bs ?)?3036\b|\bsemi ?enclosed\b|\bwired? (?:fuses?|carriers?|type)\b|\bfuse ?wires?\b|\bre ?wire fuses?\b|(?<!fixed |hard )\bwire\b(?! (?:test|nut))|\brwf?\b|\br w\b/,
  cartridge: /\bcart?rid?ges?\b|\bcatridges?\b|\b(?:bs ?)?1361\b|\bbs ?88\b|\bh[rb]c\b/,
  breakers:
    /\bm ?cbs?\b|\bmccbs?\b|\bcbs?\b|\bbreakers?\b|\bcircuitbreakers?\b|\b(?:bs ?(?:en ?)?)?60898\b|\b(?:bs ?)?3871\b|\btrip(?:s| ?switch(?:es)?)\b/,
  rcbo: /\brcbos?\b|\b(?:bs ?(?:en ?)?)?61009\b/,
} as const
export type BoardDevice = keyof typeof DEVICES
const ANY = Object.values(DEVICES)
  .map((pattern) => pattern.source)
  .join('|')

/** What was there before, or is yet to come, is not what is there. */
const NOT_THERE: readonly RegExp[] = [
  new RegExp(
    String.raw`\b(?:no|not|non|was|were|ex|formerly|previously|old|instead of|replac(?:ed|ing|es))(?: the| an?| old| any)* (?:${ANY})(?= (?:now|replaced|removed|upgraded|changed)\b)`,
    'g',
  ),
  new RegExp(
    String.raw`\b(?:no|not|non|was|were|ex|formerly|previously|instead of|from)(?: the| an?| old| any)* (?:${ANY})`,
    'g',
  ),
  new RegExp(
    String.raw`(?:${ANY})(?: board| fuses?| unit)* (?:has |have |had )?(?:been )?(?:replaced|removed|taken out|changed out)\b(?! (?:by|with|to))`,
    'g',
  ),
]
const TO_COME =
  /\b(?:to be|needs?|due(?: to)?|awaiting|requires?|required|planned|recommend(?:ed)?|upgrade|replace|change)\b.*$/
const BECAME =
  /^.*\b(?:upgraded|replaced|changed|swapped|converted)\b(?: in)?(?: \d{4})? (?:to|with|by|for|from .* to) /

/**
 * Folded text with each device under one name, and without what has gone or is only planned.
 * @example boardWords('rewireable now mcbs') // 'mcbs'
 */
export function boardWords(folded: string): string {
  let text = folded
  for (const [pattern, word] of ONE_WORD) text = text.replaceAll(pattern, word)
  if (!/\b(?:to be|being|needs?|due to be) (?:upgraded|replaced|changed|swapped|converted)\b/.test(text))
    text = text.replace(BECAME, ' ')
  const now = /\bnow (.+)$/.exec(text)?.[1] ?? ''
  if (devicesIn(now).length > 0) text = now
  text = text.replace(TO_COME, ' ')
  for (const pattern of NOT_THERE) text = text.replaceAll(pattern, ' ')
  return text
}

/** The devices that the words name. */
export const devicesIn = (words: string): readonly BoardDevice[] =>
  (Object.keys(DEVICES) as BoardDevice[]).filter((device) => DEVICES[device].test(words))
