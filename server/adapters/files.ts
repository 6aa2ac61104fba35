/**
 * Where bytes are kept, by their SHA-256. One interface; the local folder now, storage that speaks S3 later.
 * A file is on the disk, flushed and under its final name before `put` answers, so a row never points at nothing.
 */
import { createHash, randomBytes } from 'node:crypto'
import { mkdir, open, readFile, rename, stat } from 'node:fs/promises'
import { join } from 'node:path'
import { config } from '../utils/config'

export interface FileStore {
  /** Keeps the bytes and gives their SHA-256 in hex. */
  put(bytes: Uint8Array): Promise<string>
  /** The bytes, or null where none are kept under that hash. */
  get(sha256: string): Promise<Buffer | null>
}

export function folderStore(folder: string): FileStore {
  const pathOf = (sha256: string) => join(folder, sha256.slice(0, 2), sha256)
  return {
    async put(bytes) {
      const sha256 = createHash('sha256').update(bytes).digest('hex')
      const path = pathOf(sha256)
      if (await stat(path).then(() => true, () => false)) return sha256
      await mkdir(join(folder, sha256.slice(0, 2)), { recursive: true })
      const temporary = `${path}.${randomBytes(6).toString('hex')}.part`
      const file = await open(temporary, 'wx')
      try {
        await file.writeFile(bytes)
        await file.sync()
      }
      finally {
        await file.close()
      }
      await rename(temporary, path)
      return sha256
    },
    async get(sha256) {
      if (!/^[0-9a-f]{64}$/.test(sha256)) return null
      return readFile(pathOf(sha256)).catch((error: NodeJS.ErrnoException) => {
        if (error.code === 'ENOENT') return null
        throw error
      })
    },
  }
}

let store: FileStore | undefined
export const fileStore = (): FileStore => store ??= folderStore(config().filesDir)
