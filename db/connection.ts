/**
 * How anything reaches the database: a Scope is an organisation and a connection, made only here.
 * A repository method takes one first, so a query without an organisation does not typecheck.
 */
import { type Knex } from 'knex'
import { type Actor } from '@/lib/access/actor'
import { pool } from './knex'
import { retrying } from './retrying'

declare const made: unique symbol

/** Reads within one organisation. */
export type Scope = { readonly organisationId: string; readonly db: Knex; readonly [made]: 'scope' }

/** Writes within one organisation, in one transaction. */
export type WritingScope = Scope & { readonly db: Knex.Transaction; readonly writing: true }

/**
 * Reads and writes of what belongs to the deployment and not to one organisation: people, sessions,
 * tokens, and the claiming of jobs. Few repositories take it, and no list of homes ever does.
 */
export type DeploymentScope = { readonly db: Knex; readonly [made]: 'deployment' }

type Owner = Pick<Actor, 'organisationId'>

const scope = (organisationId: string, db: Knex) => ({ organisationId, db }) as Scope

/** A scope to read with. */
export const reading = (owner: Owner): Scope => scope(owner.organisationId, pool())

/**
 * Runs the work in one transaction of one organisation, again where the database asks for it.
 * `read committed` is for long work that ends by appending to the audit trail: under the usual snapshot
 * it would be refused, and begun again, whenever anybody else had written meanwhile.
 */
export function inTransaction<T>(
  owner: Owner,
  work: (scope: WritingScope) => Promise<T>,
  isolationLevel: 'repeatable read' | 'read committed' = 'repeatable read',
): Promise<T> {
  return retrying(() =>
    pool().transaction(
      (db) => work({ ...scope(owner.organisationId, db), db, writing: true } as WritingScope),
      {
        isolationLevel,
      },
    ),
  )
}

/** A scope over the deployment, to read with or for single statements. */
export const deployment = (): DeploymentScope => ({ db: pool() }) as DeploymentScope

/** Runs the work in one transaction of the deployment. */
export function inDeploymentTransaction<T>(
  work: (scope: DeploymentScope & { within: (organisationId: string) => WritingScope }) => Promise<T>,
): Promise<T> {
  return retrying(() =>
    pool().transaction((db) =>
      work({
        ...({ db } as unknown as DeploymentScope),
        within: (organisationId) => ({ ...scope(organisationId, db), db, writing: true }) as WritingScope,
      }),
    ),
  )
}
