-- What the database itself refuses: another firm's rows, an edited seal, a reading without its person, a gap in a chain.
-- Three roles exist before this runs: copperplate_owner (this migration), copperplate_app (web), copperplate_worker.

create function current_firm() returns uuid language sql stable parallel safe
  as $$ select nullif(current_setting('app.firm_id', true), '')::uuid $$;
--> statement-breakpoint
-- Row security on every table, forced, closed where no firm is set.
do $$
declare t record;
begin
  for t in select c.relname, exists (select 1 from pg_attribute a where a.attrelid = c.oid and a.attname = 'firm_id') as has_firm
           from pg_class c where c.relnamespace = 'public'::regnamespace and c.relkind = 'r' loop
    execute format('alter table %I enable row level security', t.relname);
    execute format('alter table %I force row level security', t.relname);
    if t.has_firm then
      execute format('create policy one_firm on %I as restrictive to copperplate_app, copperplate_worker using (firm_id = (select current_firm())) with check (firm_id = (select current_firm()))', t.relname);
      execute format('create policy by_firm on %I using (firm_id = (select current_firm())) with check (firm_id = (select current_firm()))', t.relname);
      execute format('grant select, insert, update on %I to copperplate_app, copperplate_worker', t.relname);
    end if;
  end loop;
end $$;
--> statement-breakpoint
create policy one_firm on firm using (id = (select current_firm())) with check (id = (select current_firm()));
--> statement-breakpoint
grant select, update on firm to copperplate_app, copperplate_worker;
--> statement-breakpoint
-- Counters of failed sign-ins hold hashed keys of nobody's firm.
create policy counters on rate_limit using (true) with check (true);
--> statement-breakpoint
grant select, insert, update, delete on rate_limit to copperplate_app;
--> statement-breakpoint
-- A draft quote's lines may be taken out again.
grant delete on quote_line to copperplate_app;
--> statement-breakpoint
-- Only added, never changed: the grant is the first lock, the trigger below the second.
revoke update on reading, reading_confirmation, payment, outside_event, stored_file from copperplate_app, copperplate_worker;
--> statement-breakpoint
revoke insert, update on audit_event, audit_head from copperplate_app, copperplate_worker;
--> statement-breakpoint
create function refuse_change() returns trigger language plpgsql as $$
begin
  raise exception '% rows are only added, never changed or removed', tg_table_name using errcode = 'integrity_constraint_violation';
end $$;
--> statement-breakpoint
do $$
declare t text;
begin
  foreach t in array array['reading', 'reading_confirmation', 'payment', 'audit_event', 'outside_event'] loop
    execute format('create trigger only_added before update or delete on %I for each row execute function refuse_change()', t);
    execute format('create trigger never_emptied before truncate on %I for each statement execute function refuse_change()', t);
  end loop;
end $$;
--> statement-breakpoint
create function keep_seal() returns trigger language plpgsql as $$
begin
  if tg_op = 'DELETE' then
    raise exception 'a sealed certificate is never removed' using errcode = 'integrity_constraint_violation';
  end if;
  if (to_jsonb(new) - 'state') is distinct from (to_jsonb(old) - 'state') or (old.state = 'replaced' and new.state <> 'replaced') then
    raise exception 'a sealed certificate is never changed' using errcode = 'integrity_constraint_violation';
  end if;
  return new;
end $$;
--> statement-breakpoint
create trigger keep_seal before update or delete on certificate for each row execute function keep_seal();
--> statement-breakpoint
create function keep_signature() returns trigger language plpgsql as $$
begin
  if tg_op = 'DELETE' or (to_jsonb(new) - 'withdrawn_at') is distinct from (to_jsonb(old) - 'withdrawn_at') or old.withdrawn_at is not null then
    raise exception 'a signature is withdrawn, never changed' using errcode = 'integrity_constraint_violation';
  end if;
  return new;
end $$;
--> statement-breakpoint
create trigger keep_signature before update or delete on signature for each row execute function keep_signature();
--> statement-breakpoint
-- The firm's chain of events. The head row is locked, so numbers have no gaps; the hash covers the row and the one before.
create function event_text(p_number bigint, p_type text, p_job uuid, p_person uuid, p_at timestamptz, p_detail jsonb) returns text
  language sql stable as $$
  select concat_ws('|', p_number, p_type, coalesce(p_job::text, ''), coalesce(p_person::text, ''),
    to_char(p_at at time zone 'utc', 'YYYY-MM-DD"T"HH24:MI:SS.US"Z"'), p_detail::text) $$;
--> statement-breakpoint
create function record_event(p_type text, p_job uuid, p_person uuid, p_detail jsonb) returns bigint
  language plpgsql security definer set search_path = public, pg_temp as $$
declare head audit_head; at_now timestamptz := clock_timestamp(); h text;
begin
  insert into audit_head (firm_id) values (current_firm()) on conflict (firm_id) do nothing;
  select * into head from audit_head where firm_id = current_firm() for update;
  h := encode(sha256(convert_to(head.hash || '|' || event_text(head.number + 1, p_type, p_job, p_person, at_now, p_detail), 'UTF8')), 'hex');
  insert into audit_event (firm_id, number, job_id, person_id, type, detail, at, previous_hash, hash)
    values (current_firm(), head.number + 1, p_job, p_person, p_type, p_detail, at_now, head.hash, h);
  update audit_head set number = head.number + 1, hash = h where firm_id = current_firm();
  return head.number + 1;
end $$;
--> statement-breakpoint
-- The first event of the chain that does not fit, or null where all fit. The head knows the last one, so that rows cut off the end show too.
create function first_broken_event() returns bigint language sql stable as $$
  with chain as (
    select number, previous_hash, hash, type, job_id, person_id, at, detail,
      lag(hash, 1, '') over (order by number) as before, row_number() over (order by number) as place
    from audit_event where firm_id = current_firm()),
  ends as (
    select coalesce((select max(number) from chain), 0) as last, coalesce((select hash from chain order by number desc limit 1), '') as last_hash,
      coalesce((select number from audit_head where firm_id = current_firm()), 0) as head, coalesce((select hash from audit_head where firm_id = current_firm()), '') as head_hash)
  select min(number) from (
    select number from chain
    where number <> place or previous_hash <> before
      or hash <> encode(sha256(convert_to(previous_hash || '|' || event_text(number, type, job_id, person_id, at, detail), 'UTF8')), 'hex')
    union all
    select case when head = last then last else least(head, last) + 1 end from ends where head <> last or head_hash <> last_hash) faults $$;
--> statement-breakpoint
-- Numbers without gaps: the counter's row stays locked until the transaction that took the number ends.
create function next_number(p_name text) returns integer language sql as $$
  insert into counter (firm_id, name, last) values (current_firm(), p_name, 1)
  on conflict (firm_id, name) do update set last = counter.last + 1 returning last $$;
--> statement-breakpoint
-- The few look-ups that come before the firm is known. They run as the owner, who may read exactly these tables.
do $$
declare t text;
begin
  foreach t in array array['person', 'membership', 'sign_in_session', 'person_token', 'customer_link', 'certificate', 'checkout', 'outbox_message', 'paper', 'job', 'customer', 'premises'] loop
    execute format('create policy look_up on %I for select to copperplate_owner using (true)', t);
  end loop;
end $$;
--> statement-breakpoint
create policy look_up on firm for select to copperplate_owner using (true);
--> statement-breakpoint
create function find_sign_in(p_email text) returns table (firm_id uuid, person_id uuid, password_hash text)
  language sql stable security definer set search_path = public, pg_temp as $$
  select p.firm_id, p.id, p.password_hash from person p join membership m on m.firm_id = p.firm_id and m.person_id = p.id
  where lower(p.email) = lower(p_email) and m.active $$;
--> statement-breakpoint
create function find_session(p_id text) returns table (firm_id uuid, person_id uuid, name text, email text, roles text[], crew_id uuid, firm_name text, country text, settings jsonb, expires_at timestamptz, last_seen_at timestamptz)
  language sql stable security definer set search_path = public, pg_temp as $$
  select s.firm_id, s.person_id, p.name, p.email, m.roles, m.crew_id, f.name, f.country, f.settings, s.expires_at, s.last_seen_at
  from sign_in_session s
  join person p on p.firm_id = s.firm_id and p.id = s.person_id
  join membership m on m.firm_id = s.firm_id and m.person_id = s.person_id
  join firm f on f.id = s.firm_id
  where s.id = p_id and s.revoked_at is null and s.expires_at > now() and m.active $$;
--> statement-breakpoint
create function find_person_token(p_hash text, p_purpose text) returns table (firm_id uuid, id uuid, person_id uuid, name text, email text, firm_name text)
  language sql stable security definer set search_path = public, pg_temp as $$
  select t.firm_id, t.id, t.person_id, p.name, p.email, f.name from person_token t
  join person p on p.firm_id = t.firm_id and p.id = t.person_id join firm f on f.id = t.firm_id
  where t.token_hash = p_hash and t.purpose = p_purpose and t.used_at is null and t.expires_at > now() $$;
--> statement-breakpoint
create function find_person_by_email(p_email text) returns table (firm_id uuid, person_id uuid, name text)
  language sql stable security definer set search_path = public, pg_temp as $$
  select p.firm_id, p.id, p.name from person p join membership m on m.firm_id = p.firm_id and m.person_id = p.id
  where lower(p.email) = lower(p_email) and m.active $$;
--> statement-breakpoint
create function find_customer_link(p_hash text) returns table (firm_id uuid, id uuid, job_id uuid, purpose text, subject_id uuid, sent_to text, expires_at timestamptz, withdrawn_at timestamptz)
  language sql stable security definer set search_path = public, pg_temp as $$
  select l.firm_id, l.id, l.job_id, l.purpose, l.subject_id, l.sent_to, l.expires_at, l.withdrawn_at from customer_link l where l.token_hash = p_hash $$;
--> statement-breakpoint
create function find_certificate(p_id uuid, p_hash text, p_pdf text) returns table (firm_id uuid, id uuid)
  language sql stable security definer set search_path = public, pg_temp as $$
  select c.firm_id, c.id from certificate c where c.id = p_id
  union select c.firm_id, c.id from certificate c where c.hash = p_hash
  union select p.firm_id, p.source_id from paper p join certificate c on c.firm_id = p.firm_id and c.id = p.source_id where p.sha256 = p_pdf
  limit 1 $$;
--> statement-breakpoint
create function find_certificate_by_words(p_words text, p_number text) returns table (firm_id uuid, id uuid)
  language sql stable security definer set search_path = public, pg_temp as $$
  select c.firm_id, c.id from certificate c where c.words = p_words and (p_number is null or c.number = p_number) limit 2 $$;
--> statement-breakpoint
create function find_checkout(p_outside_id text) returns table (firm_id uuid, id uuid)
  language sql stable security definer set search_path = public, pg_temp as $$
  select c.firm_id, c.id from checkout c where c.outside_id = p_outside_id $$;
--> statement-breakpoint
-- Messages that may go now, oldest first, as (firm, id): the worker then works inside each firm.
create function find_due_messages(p_limit integer) returns table (firm_id uuid, id uuid)
  language sql stable security definer set search_path = public, pg_temp as $$
  select m.firm_id, m.id from outbox_message m left join paper p on p.firm_id = m.firm_id and p.id = m.waits_for_paper
  where m.state = 'queued' and m.next_try_at <= now() and (m.waits_for_paper is null or p.state = 'made')
  order by m.next_try_at, m.id limit p_limit $$;
--> statement-breakpoint
create function find_stuck_claims(p_older_than interval) returns table (firm_id uuid, id uuid)
  language sql stable security definer set search_path = public, pg_temp as $$
  select m.firm_id, m.id from outbox_message m where m.state = 'claimed' and m.claimed_at < now() - p_older_than $$;
--> statement-breakpoint
create function find_papers_to_make(p_limit integer) returns table (firm_id uuid, id uuid)
  language sql stable security definer set search_path = public, pg_temp as $$
  select p.firm_id, p.id from paper p where p.state = 'to-make' order by p.made_at limit p_limit $$;
--> statement-breakpoint
-- The worker sleeps until there is something to send.
create function wake_outbox() returns trigger language plpgsql as $$ begin perform pg_notify('outbox', ''); return null; end $$;
--> statement-breakpoint
create trigger wake_outbox after insert on outbox_message for each statement execute function wake_outbox();
--> statement-breakpoint
create trigger wake_outbox after update of state on paper for each statement execute function wake_outbox();
--> statement-breakpoint
-- One page of the jobs list in one round trip: sets the firm for this statement and reads under row security.
create function job_page(p_firm uuid, p_stage text, p_before timestamptz, p_before_id uuid, p_limit integer)
  returns table (id uuid, ref text, stage text, side_state text, with_whom text, next_day date, changed_at timestamptz, customer text, address text, town text, postcode text)
  language plpgsql as $$
begin
  perform set_config('app.firm_id', p_firm::text, true);
  return query
    select j.id, j.ref, j.stage, j.side_state, j.with_whom, j.next_day, j.changed_at, c.name, p.address, p.town, p.postcode
    from job j join customer c on c.firm_id = j.firm_id and c.id = j.customer_id join premises p on p.firm_id = j.firm_id and p.id = j.premises_id
    where j.firm_id = p_firm and (p_stage is null or j.stage = p_stage) and (p_before is null or (j.changed_at, j.id) < (p_before, p_before_id))
    order by j.changed_at desc, j.id desc limit p_limit;
end $$;
--> statement-breakpoint
create index customer_words on customer using gin (firm_id, lower(name) gin_trgm_ops);
--> statement-breakpoint
create index premises_words on premises using gin (firm_id, lower(address || ' ' || town || ' ' || postcode) gin_trgm_ops);
--> statement-breakpoint
create index job_by_customer on job (firm_id, customer_id);
--> statement-breakpoint
create index job_by_premises on job (firm_id, premises_id);
--> statement-breakpoint
create index premises_outward on premises (firm_id, upper(postcode) text_pattern_ops);
--> statement-breakpoint
create index job_ref_start on job (firm_id, upper(ref) text_pattern_ops);
--> statement-breakpoint
-- Search beside row security: ILIKE is not leakproof, so under a policy the planner would read the whole table.
-- The firm stands in every predicate, and the caller must be in that firm already or name it from a checked session.
create function search_jobs(p_firm uuid, p_words text, p_limit integer)
  returns table (id uuid, ref text, stage text, side_state text, with_whom text, next_day date, changed_at timestamptz, customer text, address text, town text, postcode text)
  language plpgsql stable security definer set search_path = public, pg_temp set plan_cache_mode = force_custom_plan as $$
declare words text := lower(p_words); start text := upper(p_words);
begin
  if length(words) < 3 then
    return query
      with hit as (
        (select j.id from job j where j.firm_id = p_firm and upper(j.ref) like start || '%' limit p_limit)
        union (select j.id from premises p join job j on j.firm_id = p.firm_id and j.premises_id = p.id where p.firm_id = p_firm and upper(p.postcode) like start || '%' limit p_limit))
      select j.id, j.ref, j.stage, j.side_state, j.with_whom, j.next_day, j.changed_at, c.name, p.address, p.town, p.postcode
      from hit join job j on j.firm_id = p_firm and j.id = hit.id join customer c on c.firm_id = p_firm and c.id = j.customer_id join premises p on p.firm_id = p_firm and p.id = j.premises_id
      order by j.changed_at desc, j.id desc limit p_limit;
    return;
  end if;
  return query
    with hit as (
      (select j.id from job j where j.firm_id = p_firm and upper(j.ref) like start || '%' limit p_limit)
      union (select j.id from customer c join job j on j.firm_id = c.firm_id and j.customer_id = c.id where c.firm_id = p_firm and lower(c.name) like '%' || words || '%' limit p_limit)
      union (select j.id from premises p join job j on j.firm_id = p.firm_id and j.premises_id = p.id where p.firm_id = p_firm and lower(p.address || ' ' || p.town || ' ' || p.postcode) like '%' || words || '%' limit p_limit))
    select j.id, j.ref, j.stage, j.side_state, j.with_whom, j.next_day, j.changed_at, c.name, p.address, p.town, p.postcode
    from hit join job j on j.firm_id = p_firm and j.id = hit.id join customer c on c.firm_id = p_firm and c.id = j.customer_id join premises p on p.firm_id = p_firm and p.id = j.premises_id
    order by j.changed_at desc, j.id desc limit p_limit;
end $$;
--> statement-breakpoint
-- Functions that run as the owner are the allow-list of the catalogue test.
revoke all on function find_sign_in(text), find_session(text), find_person_token(text, text), find_person_by_email(text), find_customer_link(text), find_certificate(uuid, text, text), find_certificate_by_words(text, text), find_checkout(text), find_due_messages(integer), find_stuck_claims(interval), find_papers_to_make(integer), search_jobs(uuid, text, integer), record_event(text, uuid, uuid, jsonb) from public;
--> statement-breakpoint
grant execute on function find_sign_in(text), find_session(text), find_person_token(text, text), find_person_by_email(text), find_customer_link(text), find_certificate(uuid, text, text), find_certificate_by_words(text, text), find_checkout(text), search_jobs(uuid, text, integer) to copperplate_app;
--> statement-breakpoint
grant execute on function find_due_messages(integer), find_stuck_claims(interval), find_papers_to_make(integer) to copperplate_worker;
--> statement-breakpoint
grant execute on function record_event(text, uuid, uuid, jsonb) to copperplate_app, copperplate_worker;
