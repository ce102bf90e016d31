import { closePool } from '@/db/knex'

/** Lets go of the database, for a command that ends. */
export const stopDatabase = (): Promise<void> => closePool()
