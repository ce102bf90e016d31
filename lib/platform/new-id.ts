import { v7 } from 'uuid'

/** A fresh identifier that may leave the server: a UUIDv7, random and sorted by time of making. */
export const newId = (): string => v7()
