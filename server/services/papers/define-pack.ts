import { and, eq, inArray, isNull, sql } from 'drizzle-orm'
import { certificateRecord, type CertificateRecord } from '../../../shared/schemas/sealed-record'
import { findShot } from '../../../shared/job/shots.data'
import { formatDay, formatMoment } from '../../../shared/utils/dates'
import { fileStore } from '../../adapters/files'
import type { FirmTx } from '../../db/firm-db'
import { certificate } from '../../db/schema/certificate'
import { firm } from '../../db/schema/firm'
import { auditHead } from '../../db/schema/message'
import { notice } from '../../db/schema/notice'
import { photograph, storedFile } from '../../db/schema/reading'
import { loadLimit, surveyAnswer, equipmentFitted, circuit } from '../../db/schema/parts'
import { packDefinition } from '../../documents/pack/layout'
import type { PackInput, PackPhotograph } from '../../documents/pack/content'
import { config } from '../../utils/config'
import type { DefinePaper } from '../../worker/make-paper'

/** The longest a smart charging point may hold its start back, set by SI 2021/1467 regulation 11 (rule SMT-03): 600 s unless the customer changes it. */
const RANDOM_DELAY_MIN = 10

/** The customer's whole pack, from the sealed record alone plus what the customer's page may say beside it. */
export const definePack: DefinePaper = async (tx, { firmId, sourceId, jobId }) => {
  const [row] = await tx.select().from(certificate).where(and(eq(certificate.firmId, firmId), eq(certificate.id, sourceId)))
  if (!row) throw new Error('The certificate of this pack is not there')
  const record = certificateRecord.parse(row.record)
  return packDefinition({
    record,
    seal: { hash: row.hash, checkUrl: `${config().baseUrl}/check/${row.id}` },
    ...await packSurroundings(tx, firmId, jobId, record),
  })
}

/** What stands in a pack beside the record: the firm's advice, the chain's head, small photographs and who was told. */
export async function packSurroundings(tx: FirmTx, firmId: string, jobId: string, record: CertificateRecord): Promise<Omit<PackInput, 'record' | 'seal'>> {
  const [theFirm] = await tx.select({ name: firm.name, telephone: firm.telephone }).from(firm).where(eq(firm.id, firmId))
  const [head] = await tx.select().from(auditHead).where(eq(auditHead.firmId, firmId))
  const notices = await tx.select().from(notice).where(and(eq(notice.firmId, firmId), eq(notice.jobId, jobId)))
  return {
    liveWith: await liveWithFacts(tx, firmId, jobId, theFirm!),
    auditHead: head?.hash ? `${head.number} ${head.hash}` : null,
    photographs: await smallPhotographs(tx, firmId, jobId, record),
    told: notices.map(each => each.sentOn ? `${each.recipient}: told on ${formatDay(each.sentOn)}${each.reference ? `, reference ${each.reference}` : ''}.` : `${each.recipient}: to be told by ${each.lastDay ? formatDay(each.lastDay) : 'a day still to be set'}.`),
  }
}

async function liveWithFacts(tx: FirmTx, firmId: string, jobId: string, theFirm: { name: string, telephone: string }): Promise<PackInput['liveWith']> {
  const content = async (table: typeof surveyAnswer, key: string) => {
    const [row] = await tx.select({ content: table.content }).from(table).where(and(eq(table.firmId, firmId), eq(table.jobId, jobId), eq(table.key, key), isNull(table.removedAt)))
    return (row?.content ?? {}) as Record<string, string | number | undefined>
  }
  const survey = await content(surveyAnswer, 'survey')
  const isolator = await content(equipmentFitted as never, 'isolator')
  const installed = { ...await content(circuit as never, 'designed'), ...await content(circuit as never, 'installed') }
  const limit = await content(loadLimit as never, 'limit')
  return {
    isolatorWhere: isolator.location ? `the isolator, ${isolator.location}` : 'the isolator beside the charging point',
    boardWhere: String(survey.board_location ?? 'where it stands'),
    boardWay: installed.number ? `way ${installed.number}` : 'the way marked for the charging point',
    firmName: theFirm.name, firmTelephone: theFirm.telephone, networkTelephone: '105',
    loadLimit_A: limit.state && limit.state !== 'none' ? Number(limit.set_A ?? limit.limit_A ?? 0) || null : null,
    randomDelay_min: RANDOM_DELAY_MIN,
    guaranteeUntil: null,
  }
}

async function smallPhotographs(tx: FirmTx, firmId: string, jobId: string, record: CertificateRecord): Promise<PackPhotograph[]> {
  const wanted = record.photographs.map(each => each.sha256)
  if (!wanted.length) return []
  const rows = await tx.select({ claim: photograph.claim, takenAt: photograph.takenAt, thumb: storedFile.thumbSha256 }).from(photograph).innerJoin(storedFile, and(eq(storedFile.firmId, photograph.firmId), eq(storedFile.sha256, photograph.sha256)))
    .where(and(eq(photograph.firmId, firmId), eq(photograph.jobId, jobId), inArray(photograph.sha256, wanted))).orderBy(sql`${photograph.serverAt}`)
  const shown: PackPhotograph[] = []
  for (const row of rows) {
    const bytes = row.thumb ? await fileStore().get(row.thumb) : null
    if (bytes) shown.push({ claim: findShot(row.claim)?.label ?? row.claim, taken: formatMoment(row.takenAt.toISOString()), jpegDataUrl: `data:image/jpeg;base64,${bytes.toString('base64')}` })
  }
  return shown
}
