'use client'
import { setNonce } from 'get-nonce'

/** Lets the dialogs and menus add their style element under the content policy. Draws nothing. */
export function StyleNonce({ nonce }: { nonce: string | undefined }) {
  if (nonce && typeof document !== 'undefined') setNonce(nonce)
  return null
}
