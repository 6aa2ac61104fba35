import { createCipheriv, createDecipheriv, createPrivateKey, generateKeyPairSync, randomBytes, type KeyObject } from 'node:crypto'

export interface SealKey { publicKeyPem: string, encryptedPrivateKey: string }

const FORM = 'v1'

/** A new Ed25519 pair for a firm; the private half leaves this function only encrypted under the server's 32-byte secret. */
export function makeSealKey(secret: Uint8Array): SealKey {
  const { publicKey, privateKey } = generateKeyPairSync('ed25519')
  const publicKeyPem = publicKey.export({ type: 'spki', format: 'pem' }).toString()
  const plain = privateKey.export({ type: 'pkcs8', format: 'der' })
  const nonce = randomBytes(12)
  const cipher = createCipheriv('aes-256-gcm', secretKey(secret), nonce).setAAD(boundTo(publicKeyPem))
  const sealed = Buffer.concat([cipher.update(plain), cipher.final()])
  plain.fill(0)
  const encryptedPrivateKey = [FORM, ...[nonce, sealed, cipher.getAuthTag()].map(part => part.toString('base64url'))].join('.')
  return { publicKeyPem, encryptedPrivateKey }
}

/** The private half for signing. Throws when the secret is another, or when either half was changed. */
export function openSealKey(key: SealKey, secret: Uint8Array): KeyObject {
  const [form, nonce, sealed, tag] = key.encryptedPrivateKey.split('.')
  if (form !== FORM || !nonce || !sealed || !tag) throw new TypeError('The private key is not in a form this version knows')
  const decipher = createDecipheriv('aes-256-gcm', secretKey(secret), Buffer.from(nonce, 'base64url'), { authTagLength: 16 })
    .setAAD(boundTo(key.publicKeyPem)).setAuthTag(Buffer.from(tag, 'base64url'))
  const plain = Buffer.concat([decipher.update(Buffer.from(sealed, 'base64url')), decipher.final()])
  const privateKey = createPrivateKey({ key: plain, type: 'pkcs8', format: 'der' })
  plain.fill(0)
  return privateKey
}

/** The encrypted half is tied to its public half, so that two firms' keys cannot be swapped in the table. */
const boundTo = (publicKeyPem: string) => Buffer.from(`copperplate-seal-key-${FORM}\n${publicKeyPem}`, 'utf8')

function secretKey(secret: Uint8Array): Uint8Array {
  if (secret.length !== 32) throw new RangeError('COPPERPLATE_KEY_SECRET must be 32 bytes')
  return secret
}
