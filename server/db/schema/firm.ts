import { sql } from 'drizzle-orm'
import { bigint, boolean, check, date, foreignKey, integer, jsonb, pgTable, primaryKey, text, unique, uniqueIndex, uuid } from 'drizzle-orm/pg-core'
import type { FirmSettings } from '../../../shared/types/firm'
import { firmId, madeAt, moment } from './columns'

export const firm = pgTable('firm', {
  id: uuid('id').primaryKey(),
  name: text('name').notNull(),
  address: text('address').notNull(),
  telephone: text('telephone').notNull(),
  email: text('email').notNull(),
  country: text('country').notNull().default('England'),
  scheme: text('scheme').notNull().default(''),
  registration: text('registration').notNull().default(''),
  certificatePrefix: text('certificate_prefix').notNull(),
  vatNumber: text('vat_number'),
  settings: jsonb('settings').$type<FirmSettings>().notNull(),
  madeAt: madeAt(),
})

export const person = pgTable('person', {
  firmId: firmId().references(() => firm.id),
  id: uuid('id').notNull(),
  name: text('name').notNull(),
  email: text('email').notNull(),
  telephone: text('telephone'),
  passwordHash: text('password_hash'),
  madeAt: madeAt(),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  uniqueIndex('person_email_once').on(sql`lower(${t.email})`),
])

export const membership = pgTable('membership', {
  firmId: firmId(),
  personId: uuid('person_id').notNull(),
  roles: text('roles').array().notNull(),
  active: boolean('active').notNull().default(true),
  crewId: uuid('crew_id'),
  madeAt: madeAt(),
}, t => [
  primaryKey({ columns: [t.firmId, t.personId] }),
  foreignKey({ columns: [t.firmId, t.personId], foreignColumns: [person.firmId, person.id] }),
  check('membership_roles_known', sql`${t.roles} <@ array['office','installer','supervisor','principal']::text[]`),
])

export const crew = pgTable('crew', {
  firmId: firmId().references(() => firm.id),
  id: uuid('id').notNull(),
  name: text('name').notNull(),
  position: integer('position').notNull().default(0),
}, t => [primaryKey({ columns: [t.firmId, t.id] }), unique('crew_name_once').on(t.firmId, t.name)])

/** What a person is competent to sign for; a capacity is signed only by someone who has it here on the day. */
export const qualification = pgTable('qualification', {
  firmId: firmId(),
  id: uuid('id').notNull(),
  personId: uuid('person_id').notNull(),
  title: text('title').notNull(),
  number: text('number').notNull().default(''),
  capacities: text('capacities').array().notNull(),
  validTo: date('valid_to', { mode: 'string' }),
  madeAt: madeAt(),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  foreignKey({ columns: [t.firmId, t.personId], foreignColumns: [person.firmId, person.id] }),
])

/** A tablet or laptop that has signed in, so that "held here" can name it. */
export const device = pgTable('device', {
  firmId: firmId().references(() => firm.id),
  id: uuid('id').notNull(),
  name: text('name').notNull(),
  lastSeenAt: moment('last_seen_at').notNull().defaultNow(),
}, t => [primaryKey({ columns: [t.firmId, t.id] })])

/** The server's own record of a sign-in: the sealed cookie carries only its id, so that it can be revoked. */
export const signInSession = pgTable('sign_in_session', {
  firmId: firmId(),
  id: text('id').notNull().unique('sign_in_session_id_once'),
  personId: uuid('person_id').notNull(),
  userAgent: text('user_agent').notNull().default(''),
  madeAt: madeAt(),
  lastSeenAt: moment('last_seen_at').notNull().defaultNow(),
  expiresAt: moment('expires_at').notNull(),
  revokedAt: moment('revoked_at'),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  foreignKey({ columns: [t.firmId, t.personId], foreignColumns: [person.firmId, person.id] }),
])

/** One use of a link sent to a person: an invitation or a new password. Only the token's SHA-256 is kept. */
export const personToken = pgTable('person_token', {
  firmId: firmId(),
  id: uuid('id').notNull(),
  personId: uuid('person_id').notNull(),
  purpose: text('purpose').notNull(),
  tokenHash: text('token_hash').notNull().unique('person_token_hash_once'),
  expiresAt: moment('expires_at').notNull(),
  usedAt: moment('used_at'),
  madeAt: madeAt(),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  foreignKey({ columns: [t.firmId, t.personId], foreignColumns: [person.firmId, person.id] }),
  check('person_token_purpose_known', sql`${t.purpose} in ('invitation','password-reset')`),
])

/** Counters of failed sign-ins (kept by rate-limiter-flexible); holds hashed keys only and belongs to no firm. */
export const rateLimit = pgTable('rate_limit', {
  key: text('key').primaryKey(),
  points: integer('points').notNull().default(0),
  expire: bigint('expire', { mode: 'number' }),
})
