/** Somebody who is not signed in. */
export type Visitor = {
  /** the network address that they come from, 'unknown' where it cannot be told */
  readonly ip: string
  /** the content of the device's cookie, null where there is none */
  readonly device: string | null
}
