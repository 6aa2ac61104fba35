/** The product's own functions, reached from plain scripts: TypeScript goes through jiti, `#shared` and `#server` to their folders. */
import { createJiti } from 'jiti'
import { inRoot } from '../lib/paths.mjs'

const FILES = [
  '#server/db/firm-db', '#server/db/pool', '#server/db/queries/events', '#server/db/queries/jobs', '#server/db/queries/job-record', '#server/utils/config',
  '#server/db/schema/firm', '#server/db/schema/job', '#server/db/schema/reading', '#server/db/schema/money', '#server/db/schema/message', '#server/db/schema/certificate',
  '#server/services/firm-context', '#server/services/jobs/add-job', '#server/services/visits/book-visit', '#server/services/record/apply-mutation', '#server/services/seal/seal-key', '#server/services/photographs/keep-file',
  '#server/services/links/customer-links', '#server/services/notices/mark-notice-sent', '#server/services/packs/send-pack', '#server/services/quotes/send-quote', '#server/services/quotes/customer-acts', '#server/services/quotes/office-acts', '#server/services/sign-off/sign-capacities', '#server/services/sign-off/countersign-job', '#server/services/sign-off/send-back',
  '#shared/job/mutations', '#shared/job/tests.data', '#shared/job/put-back', '#shared/job/inspections.data', '#shared/job/shots.data', '#shared/job/completeness', '#shared/job/judge/judge-job', '#shared/pricing/quote-terms', '#shared/job/rules/mpan', '#shared/utils/dates', '#shared/utils/reading',
]

/** Every export of the files above in one object; two of one name would be a fault of the list. */
export async function loadServices() {
  const jiti = createJiti(import.meta.url, { alias: { '#shared': inRoot('shared'), '#server': inRoot('server') } })
  const services = {}
  for (const file of FILES) Object.assign(services, await jiti.import(file))
  return services
}
