import { createPublicKey, sign, verify, type KeyObject } from 'node:crypto'

/** Keeps a seal's signature from being taken for a signature over anything else. */
const PREFIX = 'copperplate-seal-v1'

/** What is signed: the prefix in ASCII, then the 32 bytes of the hash. */
export function bytesToSign(hashHex: string): Buffer {
  if (!/^[0-9a-f]{64}$/.test(hashHex)) throw new RangeError('A seal is signed over a SHA-256 in lower-case hexadecimal')
  return Buffer.concat([Buffer.from(PREFIX, 'ascii'), Buffer.from(hashHex, 'hex')])
}

/** Ed25519 signature over a record's hash, in base64. */
export function signHash(hashHex: string, privateKey: KeyObject): string {
  return sign(null, bytesToSign(hashHex), privateKey).toString('base64')
}

/** Whether the signature belongs to this hash and key. A damaged signature or key is simply not genuine. */
export function verifyHash(hashHex: string, signatureBase64: string, publicKeyPem: string): boolean {
  try {
    const key = createPublicKey(publicKeyPem)
    return key.asymmetricKeyType === 'ed25519' && verify(null, bytesToSign(hashHex), key, Buffer.from(signatureBase64, 'base64'))
  }
  catch {
    return false
  }
}
