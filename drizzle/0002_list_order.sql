-- The list's pages come straight out of its indexes. Those put empty values last, so the order asked for says so too:
-- without it PostgreSQL reads and sorts every job of every firm. Each way of asking is a statement of its own, because
-- a condition that may fall away cannot be looked up in an index.
create or replace function job_page(p_firm uuid, p_stage text, p_before timestamptz, p_before_id uuid, p_limit integer)
  returns table (id uuid, ref text, stage text, side_state text, with_whom text, next_day date, changed_at timestamptz, customer text, address text, town text, postcode text)
  language plpgsql as $$
begin
  perform set_config('app.firm_id', p_firm::text, true);
  p_before := coalesce(p_before, 'infinity');
  p_before_id := coalesce(p_before_id, 'ffffffff-ffff-ffff-ffff-ffffffffffff');
  if p_stage is null then
    return query
      with page as materialized (
        select * from job j where j.firm_id = p_firm and (j.changed_at, j.id) < (p_before, p_before_id)
        order by j.changed_at desc nulls last, j.id desc nulls last limit p_limit)
      select j.id, j.ref, j.stage, j.side_state, j.with_whom, j.next_day, j.changed_at, c.name, p.address, p.town, p.postcode
      from page j join customer c on c.firm_id = p_firm and c.id = j.customer_id join premises p on p.firm_id = p_firm and p.id = j.premises_id
      order by j.changed_at desc, j.id desc;
  else
    return query
      with page as materialized (
        select * from job j where j.firm_id = p_firm and j.stage = p_stage and (j.changed_at, j.id) < (p_before, p_before_id)
        order by j.changed_at desc nulls last, j.id desc nulls last limit p_limit)
      select j.id, j.ref, j.stage, j.side_state, j.with_whom, j.next_day, j.changed_at, c.name, p.address, p.town, p.postcode
      from page j join customer c on c.firm_id = p_firm and c.id = j.customer_id join premises p on p.firm_id = p_firm and p.id = j.premises_id
      order by j.changed_at desc, j.id desc;
  end if;
end $$;
