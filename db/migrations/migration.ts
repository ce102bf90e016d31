/** One step of the schema: statements up, and the same undone. Expand, migrate, contract. */
export type Migration = {
  readonly name: string
  readonly up: readonly string[]
  readonly down: readonly string[]
}
