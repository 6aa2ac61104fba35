import { describe, expect, it } from 'vitest'
import { pools } from '../support/db-setup'

const APP_ROLES = ['copperplate_app', 'copperplate_worker']

async function ask<Row extends Record<string, unknown>>(text: string, values: unknown[] = []): Promise<Row[]> {
  return (await pools.owner.query<Row>(text, values)).rows
}

const names = async (text: string, values: unknown[] = []) => (await ask<{ name: string }>(text, values)).map(row => row.name).sort()

describe('tables', () => {
  it('all have row security, forced', async () => {
    expect(await names('select relname as name from pg_class where relnamespace = \'public\'::regnamespace and relkind in (\'r\', \'p\') and not (relrowsecurity and relforcerowsecurity)')).toEqual([])
    expect(await ask('select 1 from pg_class where relnamespace = \'public\'::regnamespace and relkind = \'r\'')).not.toHaveLength(0)
  })

  it('hold the web and the worker to one firm by a restrictive policy on reading and writing', async () => {
    const held = await names(`select c.relname as name from pg_policy p join pg_class c on c.oid = p.polrelid
      where p.polname = 'one_firm' and not p.polpermissive and p.polcmd = '*'
        and pg_get_expr(p.polqual, p.polrelid) like '%firm_id = ( SELECT current_firm()%' and pg_get_expr(p.polwithcheck, p.polrelid) like '%firm_id = ( SELECT current_firm()%'
        and (select array_agg(r.rolname::text order by r.rolname) from pg_roles r where r.oid = any (p.polroles)) = $1`, [APP_ROLES])
    const all = await names('select relname as name from pg_class where relnamespace = \'public\'::regnamespace and relkind = \'r\'')
    // The firm itself has its id where others have `firm_id`; the counters of failed sign-ins are nobody's.
    expect(all.filter(table => !held.includes(table))).toEqual(['firm', 'rate_limit'])
  })

  it('let no other policy through to the web or the worker', async () => {
    const open = await ask<{ name: string, policy: string }>(`select c.relname as name, p.polname as policy from pg_policy p join pg_class c on c.oid = p.polrelid
      where c.relnamespace = 'public'::regnamespace and p.polpermissive and pg_get_expr(p.polqual, p.polrelid) not like '%current_firm()%'
        and exists (select 1 from unnest(p.polroles) r where r = 0 or r in (select oid from pg_roles where rolname = any ($1)))`, [APP_ROLES])
    expect(open).toEqual([{ name: 'rate_limit', policy: 'counters' }])
  })

  it('have the firm at the head of their key', async () => {
    const keys = await ask<{ name: string, first: string }>(`select c.relname as name, a.attname as first from pg_constraint k join pg_class c on c.oid = k.conrelid join pg_attribute a on a.attrelid = c.oid and a.attnum = k.conkey[1]
      where k.contype = 'p' and c.relnamespace = 'public'::regnamespace`)
    expect(keys.filter(key => key.first !== 'firm_id').map(key => key.name).sort()).toEqual(['firm', 'rate_limit'])
  })

  it('refer to each other with the firm in the reference', async () => {
    const loose = await names(`select k.conname as name from pg_constraint k join pg_class c on c.oid = k.conrelid
      where k.contype = 'f' and c.relnamespace = 'public'::regnamespace
        and not exists (select 1 from pg_attribute a where a.attrelid = c.oid and a.attnum = any (k.conkey) and a.attname = 'firm_id')`)
    expect(loose).toEqual([])
  })
})

describe('roles', () => {
  it('of web and worker have ordinary powers only', async () => {
    const roles = await ask('select rolname, rolsuper, rolbypassrls, rolcreatedb, rolcreaterole, rolreplication from pg_roles where rolname = any ($1) order by rolname', [APP_ROLES])
    expect(roles).toEqual(APP_ROLES.map(rolname => ({ rolname, rolsuper: false, rolbypassrls: false, rolcreatedb: false, rolcreaterole: false, rolreplication: false })))
  })

  it('of web and worker are members of none', async () => {
    expect(await ask('select 1 from pg_auth_members where member in (select oid from pg_roles where rolname = any ($1))', [APP_ROLES])).toEqual([])
  })

  it('of web and worker own nothing', async () => {
    expect(await names('select c.relname as name from pg_class c join pg_roles r on r.oid = c.relowner where r.rolname = any ($1)', [APP_ROLES])).toEqual([])
    expect(await names('select p.proname as name from pg_proc p join pg_roles r on r.oid = p.proowner where r.rolname = any ($1)', [APP_ROLES])).toEqual([])
  })

  it('of web and worker make nothing in the public schema', async () => {
    expect(await ask('select r as role from unnest($1::text[]) r where has_schema_privilege(r, \'public\', \'create\') or has_database_privilege(r, current_database(), \'create\')', [APP_ROLES])).toEqual([])
    await expect(pools.app.query('create table intruder (a int)')).rejects.toThrow('permission denied')
    await expect(pools.app.query('alter table job disable row level security')).rejects.toThrow('must be owner')
    await expect(pools.app.query('set role copperplate_owner')).rejects.toThrow('permission denied')
  })

  it('remove no rows but a draft quote\'s lines and spent counters', async () => {
    const grants = await ask(`select grantee, table_name, privilege_type from information_schema.role_table_grants
      where table_schema = 'public' and grantee = any ($1) and privilege_type not in ('SELECT', 'INSERT', 'UPDATE') order by table_name`, [[...APP_ROLES, 'PUBLIC']])
    expect(grants).toEqual([
      { grantee: 'copperplate_app', table_name: 'quote_line', privilege_type: 'DELETE' },
      { grantee: 'copperplate_app', table_name: 'rate_limit', privilege_type: 'DELETE' },
    ])
  })

  it('change nothing that is only added', async () => {
    const grants = await names(`select distinct table_name as name from information_schema.role_table_grants where table_schema = 'public' and grantee = any ($1) and privilege_type = 'UPDATE'
      and table_name = any (array['reading', 'reading_confirmation', 'payment', 'outside_event', 'audit_event', 'audit_head'])`, [APP_ROLES])
    expect(grants).toEqual([])
    expect(await names('select distinct table_name as name from information_schema.role_table_grants where table_schema = \'public\' and grantee = any ($1) and privilege_type = \'INSERT\' and table_name = any (array[\'audit_event\', \'audit_head\', \'firm\'])', [APP_ROLES])).toEqual([])
  })
})

describe('functions that run as the owner', () => {
  const FOR_WEB = ['find_certificate', 'find_certificate_by_words', 'find_checkout', 'find_customer_link', 'find_person_by_email', 'find_person_token', 'find_session', 'find_sign_in', 'record_event', 'search_jobs']
  const FOR_WORKER = ['find_due_messages', 'find_papers_to_make', 'find_stuck_claims', 'record_event']
  const definer = 'from pg_proc where prosecdef and pronamespace = \'public\'::regnamespace'

  it('are exactly these', async () => {
    expect(await names(`select proname as name ${definer}`)).toEqual([...new Set([...FOR_WEB, ...FOR_WORKER])].sort())
  })

  it('fix where they look for names', async () => {
    expect(await names(`select proname as name ${definer} and not ('search_path=public, pg_temp' = any (proconfig))`)).toEqual([])
  })

  it('may be called by those who need them alone', async () => {
    expect(await names(`select proname as name ${definer} and has_function_privilege('copperplate_app', oid, 'execute')`)).toEqual(FOR_WEB)
    expect(await names(`select proname as name ${definer} and has_function_privilege('copperplate_worker', oid, 'execute')`)).toEqual(FOR_WORKER)
    expect(await names(`select proname as name ${definer} and exists (select 1 from aclexplode(proacl) a where a.grantee = 0)`)).toEqual([])
  })
})
