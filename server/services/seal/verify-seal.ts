import { hashRecord } from './hash-record'
import { verifyHash } from './sign-hash'

export interface Seal { hash: string, signature: string, publicKeyPem: string }

export type SealFault = 'record-changed' | 'signature-wrong' | 'chain-broken'

/** Whether a record, its seal and its place in the firm's chain belong together; `faults` is empty when they do. */
export function verifySeal<Kept extends { previousHash: string | null }>(record: Kept, seal: Seal, previousHash: string | null): { genuine: boolean, faults: SealFault[] } {
  const faults: SealFault[] = []
  if (hashOrNull(record) !== seal.hash) faults.push('record-changed')
  if (!verifyHash(seal.hash, seal.signature, seal.publicKeyPem)) faults.push('signature-wrong')
  if (record.previousHash !== previousHash) faults.push('chain-broken')
  return { genuine: faults.length === 0, faults }
}

function hashOrNull(record: unknown): string | null {
  try {
    return hashRecord(record)
  }
  catch {
    return null
  }
}
