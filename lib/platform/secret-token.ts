/** Tokens for links that stand in for a sign-in: sent once, stored only as a hash. */
import { createHash, randomBytes } from 'node:crypto'

/** A fresh token of 256 random bits, safe in a URL. */
export const newToken = (): string => randomBytes(32).toString('base64url')

/** What is stored of a token [hex, 64 characters]. */
export const tokenHash = (token: string): string => createHash('sha256').update(token).digest('hex')
