import { foreignKey, index, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core'
import { editable, firmId } from './columns'
import { firm } from './firm'

export const customer = pgTable('customer', {
  firmId: firmId().references(() => firm.id),
  id: uuid('id').notNull(),
  name: text('name').notNull(),
  email: text('email').notNull().default(''),
  telephone: text('telephone').notNull().default(''),
  ...editable(),
}, t => [primaryKey({ columns: [t.firmId, t.id] })])

export const premises = pgTable('premises', {
  firmId: firmId().references(() => firm.id),
  id: uuid('id').notNull(),
  customerId: uuid('customer_id').notNull(),
  address: text('address').notNull().default(''),
  town: text('town').notNull().default(''),
  postcode: text('postcode').notNull().default(''),
  country: text('country').notNull().default('England'),
  mpan: text('mpan').notNull().default(''),
  occupier: text('occupier').notNull().default(''),
  tenure: text('tenure').notNull().default(''),
  parking: text('parking').notNull().default(''),
  ...editable(),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  foreignKey({ columns: [t.firmId, t.customerId], foreignColumns: [customer.firmId, customer.id] }),
  index('premises_postcode').on(t.firmId, t.postcode),
])
