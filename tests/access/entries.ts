/** Every way into app/: its pages, its handlers by method, its actions by name. Read from the files themselves. */
import { readdirSync, readFileSync } from 'node:fs'
import { resolve } from 'node:path'

const root = resolve(import.meta.dirname, '../..')
/** The files of app/ whose path fits, from the root. */
const files = (fits: RegExp): string[] =>
  readdirSync(resolve(root, 'app'), { recursive: true, encoding: 'utf8' })
    .map((file) => `app/${file.replaceAll('\\', '/')}`)
    .filter((file) => fits.test(file))
    .sort()
export const textOf = (file: string): string => readFileSync(resolve(root, file), 'utf8')

const METHODS = ['GET', 'POST', 'PUT', 'PATCH', 'DELETE', 'HEAD', 'OPTIONS']

/** What a file exports as values: declarations, and lists with or without another name. */
export function exportsOf(text: string): string[] {
  const declared = [
    ...text.matchAll(/^export\s+(?:default\s+)?(?:async\s+)?(?:const|let|var|function\*?|class)\s+(\w+)/gm),
  ]
  const listed = [...text.matchAll(/^export\s*\{([^}]*)\}/gm)].flatMap((match) =>
    (match[1] ?? '').split(',').map(
      (one) =>
        one
          .trim()
          .split(/\s+as\s+/)
          .at(-1) ?? '',
    ),
  )
  return [...declared.map((match) => match[1] ?? ''), ...listed].filter(
    (name) => name && !name.startsWith('type '),
  )
}

export const pages = (): string[] => files(/\/page\.tsx?$/)

export const handlers = (): string[] =>
  files(/\/route\.tsx?$/).flatMap((file) =>
    exportsOf(textOf(file))
      .filter((name) => METHODS.includes(name))
      .map((method) => `${method} ${file}`),
  )

/** Files that begin with the directive, whatever they are called: each of their exports can be posted to by anybody. */
export const actionFiles = (): string[] =>
  files(/\.tsx?$/).filter((file) => /^\s*(\/\*[\s\S]*?\*\/\s*)?['"]use server['"]/.test(textOf(file)))

export const actions = (): string[] =>
  actionFiles().flatMap((file) => exportsOf(textOf(file)).map((name) => `${file}#${name}`))
