import { readIntake, type IntakeField, type IntakeFields } from '#shared/job/intake'
import type { Wishes } from '#shared/job/intake/wishes'

/** The text of an enquiry, what is understood of it, and what was corrected by hand: a correction outlives further typing. */
export function useIntake(today: string) {
  const text = ref('')
  const corrected = reactive<Partial<IntakeFields>>({})
  const wished = ref<Wishes | null>(null)
  const read = computed(() => readIntake(text.value, today))
  const fields = computed<IntakeFields>(() => ({ ...read.value.fields, ...corrected }))
  const wanted = computed<Wishes>(() => wished.value ?? read.value.wanted)

  /** What still keeps the job from being made, by the path of its field. */
  const missing = computed<Record<string, string>>(() => ({
    ...(fields.value.name.trim() ? {} : { 'customer.name': 'Enter the customer’s name.' }),
    ...(fields.value.address.trim() ? {} : { 'premises.address': 'Enter the address: house and street.' }),
    ...(fields.value.postcode.trim() ? {} : { 'premises.postcode': 'Enter the postcode.' }),
  }))
  const firstMissing = computed<IntakeField | null>(() => missing.value['customer.name'] ? 'name' : missing.value['premises.address'] ? 'address' : missing.value['premises.postcode'] ? 'postcode' : null)

  /** The request that makes the job. */
  function toJob() {
    const { name, email, telephone, ...place } = fields.value
    const wish = Object.fromEntries(Object.entries(wanted.value).filter(([, value]) => value !== undefined))
    return { customer: { name, email, telephone }, premises: place, wanted: wish, note: read.value.note }
  }

  return { text, read, fields, wanted, missing, firstMissing, toJob, correct: (field: keyof IntakeFields, value: string) => Object.assign(corrected, { [field]: value }), wish: (wish: Wishes) => wished.value = wish }
}
