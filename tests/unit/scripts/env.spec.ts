import { describe, expect, it } from 'vitest'
import { namedServer } from '../../../scripts/lib/database-up.mjs'
import { addressesFor, withDatabase } from '../../../scripts/lib/databases.mjs'
import { formatEnv, generateSecrets, parseEnv } from '../../../scripts/lib/env.mjs'
import { readConfig } from '../../../server/utils/config'

describe('parseEnv', () => {
  it('reads names and values, passes over comments, takes quotes off', () => {
    expect(parseEnv('# PORT=1\nPORT=3000\n export HOST = "0.0.0.0" \nMAIL_FROM=\'A <a@b.example>\'\nEMPTY=\nlower=1\n')).toEqual({ PORT: '3000', HOST: '0.0.0.0', MAIL_FROM: 'A <a@b.example>', EMPTY: '' })
  })

  it('gives back what formatEnv wrote, signs of base64 and addresses included', () => {
    const values = { COPPERPLATE_KEY_SECRET: 'a+/b==', DATABASE_URL: 'postgres://u:p@127.0.0.1:5432/d?x=1#y' }
    expect(parseEnv(formatEnv(values))).toEqual(values)
  })
})

describe('generateSecrets', () => {
  it('makes secrets that the configuration takes, and others each time', () => {
    const secrets = generateSecrets()
    const config = readConfig({ ...secrets, COPPERPLATE_BASE_URL: 'http://127.0.0.1:3000', COPPERPLATE_FILES_DIR: '/srv', DATABASE_URL: 'postgres://a:b@c/d' })
    expect(config.keySecret).toHaveLength(32)
    expect(config.stripe?.webhookSecret).toBe(secrets.STRIPE_WEBHOOK_SECRET)
    expect(generateSecrets().COPPERPLATE_KEY_SECRET).not.toBe(secrets.COPPERPLATE_KEY_SECRET)
  })
})

describe('database addresses', () => {
  it('names a role for each purpose', () => {
    expect(addressesFor({ port: 54329, owner: 'o', app: 'a', worker: 'w' }, 'copperplate')).toEqual({
      DATABASE_URL: 'postgres://copperplate_app:a@127.0.0.1:54329/copperplate',
      DATABASE_URL_WORKER: 'postgres://copperplate_worker:w@127.0.0.1:54329/copperplate',
      DATABASE_URL_OWNER: 'postgres://copperplate_owner:o@127.0.0.1:54329/copperplate',
    })
  })

  it('keeps everything but the database when another is asked for', () => {
    expect(withDatabase('postgres://u:p@db.example:6000/live?sslmode=require', 'copperplate_test')).toBe('postgres://u:p@db.example:6000/copperplate_test?sslmode=require')
  })

  it('uses a named server only when all three roles are named', () => {
    const all = { DATABASE_URL: 'a', DATABASE_URL_WORKER: 'b', DATABASE_URL_OWNER: 'c' }
    expect(namedServer({})).toBeNull()
    expect(namedServer({ ...all, PORT: '1' })).toEqual(all)
    expect(() => namedServer({ DATABASE_URL_OWNER: 'c' })).toThrow('DATABASE_URL_OWNER is set but not DATABASE_URL and DATABASE_URL_WORKER')
  })
})
