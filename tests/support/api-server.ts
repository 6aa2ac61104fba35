import type { TestProject } from 'vitest/node'
import { findTestServer, type TestServer } from './test-addresses'

declare module 'vitest' {
  export interface ProvidedContext {
    server: TestServer
  }
}

/** Hands the one served build to every test file: `inject('server').TEST_BASE_URL`. It builds and starts nothing itself. */
export default async function setup(project: TestProject) {
  const server = findTestServer()
  if (!server) throw new Error('These tests need a running build: start `node scripts/serve-test.mjs` in another terminal, or run `npm test`.')
  const isWell = await fetch(`${server.TEST_BASE_URL}/api/health`).then(answer => answer.ok, () => false)
  if (!isWell) throw new Error(`Nothing answers at ${server.TEST_BASE_URL}: start \`node scripts/serve-test.mjs\` again.`)
  project.provide('server', server)
}
