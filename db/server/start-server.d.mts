/** The addresses of one database, one for each user. */
export type DatabaseUrls = { readonly app: string; readonly migrate: string; readonly read: string }

export type RunningServer = {
  readonly port: number
  readonly socket: string
  readonly pid: number
  /** whether it ran already */
  readonly joined: boolean
  readonly urls: DatabaseUrls
  readonly urlsFor: (database: string) => DatabaseUrls
  /** drops every table of the database */
  readonly empty: () => Promise<string>
  /** what one query answers, as the database's owner, tab-separated */
  readonly ask: (sql: string) => Promise<string>
  /** ends the server once nobody else in this project needs it */
  readonly stop: () => Promise<'ended' | 'killed' | 'left to others'>
}

export function startServer(wanted: {
  purpose: 'demo' | 'test' | 'e2e' | 'shots' | 'bench'
  dataDir?: string
}): Promise<RunningServer>
