import { type RunningServer } from '../db/server/start-server.mjs'

export type Stack = {
  /** where the site answers */
  readonly url: string
  /** where the letters can be read: GET /messages?to=, DELETE /messages */
  readonly inbox: string
  /** what its processes run with, for commands that are to see the same database and fakes */
  readonly settings: Record<string, string>
  readonly server: RunningServer
  readonly stop: () => Promise<void>
}

export function startStack(wanted: {
  purpose: 'demo' | 'e2e' | 'shots' | 'bench'
  today?: string
  seed?: boolean
  fresh?: boolean
  web?: 'start' | 'dev' | 'none'
  host?: string
  port?: number
  signal?: AbortSignal
  step?: <T>(name: string, work: () => T | Promise<T>) => Promise<T>
}): Promise<Stack>
