import { pool } from '@/db/knex'

/** Runs some work and counts the statements that it sends to the database. */
export async function countingStatements<T>(
  work: () => Promise<T>,
): Promise<{ result: T; statements: string[] }> {
  const statements: string[] = []
  const note = ({ sql }: { sql: string }) => void statements.push(sql)
  pool().on('query', note)
  try {
    return { result: await work(), statements }
  } finally {
    pool().removeListener('query', note)
  }
}
