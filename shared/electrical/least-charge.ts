/** The least current a charger may offer a vehicle, A; with less to give, charging pauses. @source IEC 61851-1 Annex A */
export const LEAST_CHARGE_A = 6
