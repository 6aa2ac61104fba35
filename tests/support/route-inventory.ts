import { readdirSync } from 'node:fs'
import { fileURLToPath } from 'node:url'

const server = (folder: string) => fileURLToPath(new URL(`../../server/${folder}`, import.meta.url))

function routesUnder(folder: string, prefix: string): string[] {
  const files = readdirSync(server(folder), { recursive: true, encoding: 'utf8' }).filter(name => name.endsWith('.ts'))
  return files.map((file) => {
    const named = /^(.*?)(?:\.(get|post|put|patch|delete))?\.ts$/.exec(file)!
    // A file without a method answers every one of them, which no route of ours should.
    return `${named[2]?.toUpperCase() ?? 'ANY'} ${prefix}/${named[1]!.replace(/(^|\/)index$/, '')}`.replace(/\/$/, '')
  })
}

/** Every route the server has, as `POST /api/jobs/[jobId]/sign`, read from the files that make them. */
export const listRoutes = (): string[] => [...routesUnder('api', '/api'), ...routesUnder('routes', '')].sort()

export const isWrite = (route: string) => !route.startsWith('GET ')

/** The names of a route's parameters, in order. */
export const paramsOf = (route: string): string[] => [...route.matchAll(/\[(\w+)\]/g)].map(found => found[1]!)

/** The route with its parameters filled in. @throws where one has no value */
export function fillRoute(route: string, values: Record<string, string>): string {
  return route.replace(/\[(\w+)\]/g, (_, name: string) => {
    const value = values[name]
    if (value === undefined) throw new Error(`${route} has no value for [${name}]`)
    return encodeURIComponent(value)
  })
}
