import { deployment } from '@/db/connection'
import * as organisations from '@/db/repositories/organisations'

/** Whether the database answers. */
export async function checkHealth(): Promise<void> {
  await organisations.ping(deployment())
}
