/** The project's own database server, on folders of this test's alone. */
import { chmodSync, mkdtempSync, rmSync, statSync } from 'node:fs'
import { createServer, type Server } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { setTimeout as pause } from 'node:timers/promises'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { type RunningServer, startServer } from '@/db/server/start-server.mjs'

const folder = mkdtempSync(join(tmpdir(), 'fuseward server '))
const start = (name: string) => startServer({ purpose: 'shots', dataDir: join(folder, name) })

let first: RunningServer
let second: RunningServer

beforeAll(async () => {
  chmodSync(folder, 0o755)
  first = await start('one with spaces')
  second = await start('two')
}, 120_000)
afterAll(async () => {
  await first.stop()
  await second.stop()
  rmSync(folder, { recursive: true })
})

/** Another program on a port, as soon as it is free. */
async function strangerOn(port: number): Promise<Server> {
  for (;;) {
    const server = createServer()
    const listening = await new Promise<boolean>((resolve) => {
      server.once('error', () => resolve(false))
      server.listen(port, '127.0.0.1', () => resolve(true))
    })
    if (listening) return server
    await pause(50)
  }
}

describe('two servers at once', () => {
  it('have ports, sockets and contents of their own', async () => {
    expect(second.port).not.toBe(first.port)
    expect(second.socket).not.toBe(first.socket)
    await first.ask('create table here (n int primary key)')
    expect(await first.ask('show tables')).toBe('here')
    expect(await second.ask('show tables')).toBe('')
  })

  it('have a socket path that an address can hold, and a folder that only its account may enter', () => {
    expect(Buffer.byteLength(first.socket)).toBeLessThanOrEqual(107) // sun_path of unix(7), less its closing zero
    expect(statSync(join(folder, 'one with spaces')).mode & 0o077).toBe(0)
  })

  it('make users with no rights over the server, and one that changes the schema of its database alone', async () => {
    const rights = await first.ask(
      "select grantee, group_concat(privilege_type) from information_schema.user_privileges where grantee like '''fuseward%' group by 1 order by 1",
    )
    expect(rights.split('\n').map((line) => line.split('\t')[1])).toEqual(['USAGE', 'USAGE', 'USAGE'])
    const schemas = await first.ask(
      "select distinct grantee, table_schema from information_schema.schema_privileges where grantee like '''fuseward%'",
    )
    expect(schemas).toBe("'fuseward_migrate'@'127.0.0.1'\tfuseward")
  })
})

describe('a server that runs already', () => {
  it('is joined, and stays up until the last who needs it has gone', async () => {
    const joined = await start('one with spaces')
    expect([joined.joined, joined.pid, joined.port]).toEqual([true, first.pid, first.port])
    expect(await joined.stop()).toBe('left to others')
    expect(await first.ask('select 1')).toBe('1')
  })
})

describe('a server that was killed', () => {
  it('comes up again with what was committed, elsewhere if its port is taken meanwhile', async () => {
    await first.ask('create table kept (n int primary key); insert into kept values (7)')
    process.kill(first.pid, 'SIGKILL')
    const stranger = await strangerOn(first.port)
    const again = await start('one with spaces')
    expect(again.joined).toBe(false)
    expect(again.port).not.toBe(first.port)
    expect(await again.ask('select n from kept')).toBe('7')
    stranger.close()
    await first.stop()
    first = again
  })

  it('can be emptied, and keeps its users', async () => {
    await first.empty()
    expect(await first.ask('show tables')).toBe('')
    expect(await first.ask("select count(*) from mysql.user where user like 'fuseward%'")).toBe('3')
  })
})
