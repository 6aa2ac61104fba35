import { createHash, createPrivateKey, createPublicKey, randomBytes, sign } from 'node:crypto'
import { describe, expect, it } from 'vitest'
import { hashRecord } from '#server/services/seal/hash-record'
import { makeSealKey, openSealKey } from '#server/services/seal/seal-key'
import { bytesToSign, signHash, verifyHash } from '#server/services/seal/sign-hash'
import { verifySeal } from '#server/services/seal/verify-seal'

const secret = randomBytes(32)
const key = makeSealKey(secret)
const privateKey = openSealKey(key, secret)

describe('published vectors (from memory)', () => {
  it('hashes abc as FIPS 180 does', () => {
    expect(createHash('sha256').update('abc').digest('hex')).toBe('ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad')
  })

  it.each([
    ['1', '9d61b19deffd5a60ba844af492ec2cc44449c5697b326919703bac031cae7f60', 'd75a980182b10ab7d54bfed3c964073a0ee172f3daa62325af021a68f707511a', '', 'e5564300c360ac729086e2cc806e828a84877f1eb8e5d974d873e065224901555fb8821590a33bacc61e39701cf9b46bd25bf5f0595bbe24655141438e7a100b'],
    ['2', '4ccd089b28ff96da9db6c346ec114e0f5b8a319f35aba624da8cf6ed4fb8a6fb', '3d4017c3e843895a92b70aa74d1b7ebc9c982ccf2ec4968cc0cd55f12af4660c', '72', '92a009a9f0d4cab8720e820b5f642540a2b27b5416503f8fb3762223ebdb69da085ac1e43e15996e458f3613d0f11d8c387b2eaeb4302aeeb00d291612bb0c00'],
  ])('signs as RFC 8032, section 7.1, test %s', (_, seed, publicHex, message, signature) => {
    const one = createPrivateKey({ key: Buffer.from('302e020100300506032b657004220420' + seed, 'hex'), type: 'pkcs8', format: 'der' })
    expect(createPublicKey(one).export({ type: 'spki', format: 'der' }).subarray(-32).toString('hex')).toBe(publicHex)
    expect(sign(null, Buffer.from(message, 'hex'), one).toString('hex')).toBe(signature)
  })
})

describe('hash of a record', () => {
  it('is the SHA-256 of its canonical bytes', () => {
    expect(hashRecord({ b: 'Ω', a: 1 })).toBe(createHash('sha256').update('{"a":1,"b":"Ω"}', 'utf8').digest('hex'))
  })
})

describe('a firm\'s key', () => {
  it('keeps the private half unreadable and opens it under the same secret', () => {
    expect(key.encryptedPrivateKey).not.toContain('PRIVATE')
    expect(createPublicKey(privateKey).export({ type: 'spki', format: 'pem' })).toBe(key.publicKeyPem)
  })

  it('is refused under another secret, beside another public half, or when changed', () => {
    expect(() => openSealKey(key, randomBytes(32))).toThrow()
    expect(() => openSealKey({ ...key, publicKeyPem: makeSealKey(secret).publicKeyPem }, secret)).toThrow()
    expect(() => openSealKey({ ...key, encryptedPrivateKey: key.encryptedPrivateKey.replace(/\.(.)/, (_, first) => `.${first === 'A' ? 'B' : 'A'}`) }, secret)).toThrow()
    expect(() => openSealKey({ ...key, encryptedPrivateKey: 'v2.a.b.c' }, secret)).toThrow('form')
  })

  it('wants a secret of exactly 32 bytes', () => {
    expect(() => makeSealKey(randomBytes(31))).toThrow('32 bytes')
  })
})

describe('signing a hash', () => {
  const hash = hashRecord({ any: 'record' })

  it('signs the prefix and the 32 bytes of the hash', () => {
    expect(bytesToSign(hash).toString('latin1').startsWith('copperplate-seal-v1')).toBe(true)
    expect(bytesToSign(hash)).toHaveLength(19 + 32)
    expect(verifyHash(hash, signHash(hash, privateKey), key.publicKeyPem)).toBe(true)
  })

  it('finds a signature of other bytes, another key or no key at all not genuine', () => {
    const bare = sign(null, Buffer.from(hash, 'hex'), privateKey).toString('base64')
    expect(verifyHash(hash, bare, key.publicKeyPem)).toBe(false)
    expect(verifyHash(hash, signHash(hash, privateKey), makeSealKey(secret).publicKeyPem)).toBe(false)
    expect(verifyHash(hash, 'not base64', key.publicKeyPem)).toBe(false)
    expect(verifyHash(hash, signHash(hash, privateKey), 'no key')).toBe(false)
    expect(verifyHash('short', signHash(hash, privateKey), key.publicKeyPem)).toBe(false)
  })
})

describe('verifying a seal', () => {
  const previousHash = 'a'.repeat(64)
  const record = { previousHash, number: 'AB-2027-00001', zs: '0.39' }
  const hash = hashRecord(record)
  const seal = { hash, signature: signHash(hash, privateKey), publicKeyPem: key.publicKeyPem }

  it('finds record, signature and chain in order', () => {
    expect(verifySeal(record, seal, previousHash)).toEqual({ genuine: true, faults: [] })
  })

  it('names what is wrong', () => {
    expect(verifySeal({ ...record, zs: '0.38' } as typeof record, seal, previousHash).faults).toEqual(['record-changed'])
    expect(verifySeal(record, { ...seal, signature: signHash('b'.repeat(64), privateKey) }, previousHash).faults).toEqual(['signature-wrong'])
    expect(verifySeal(record, seal, null).faults).toEqual(['chain-broken'])
    expect(verifySeal({ ...record, zs: Number.NaN as unknown as string }, seal, previousHash).faults).toEqual(['record-changed'])
  })
})
