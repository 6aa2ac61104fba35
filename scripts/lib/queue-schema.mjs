import { Logger, runMigrations } from 'graphile-worker'
import { ROLES } from './databases.mjs'

/**
 * The queue's tables are made by the owner here, not by the worker at start: the worker
 * owns nothing. The library turns row security on with no policy, which would hide
 * every job from a role that is not the owner, so each role gets its own narrow policies.
 */
const GRANTS = `
  grant usage on schema graphile_worker to ${ROLES.worker}, ${ROLES.app};
  grant select, insert, update, delete on all tables in schema graphile_worker to ${ROLES.worker};
  grant usage, select on all sequences in schema graphile_worker to ${ROLES.worker}, ${ROLES.app};
  grant execute on all functions in schema graphile_worker to ${ROLES.worker}, ${ROLES.app};
  grant select, insert, update on graphile_worker._private_jobs, graphile_worker._private_job_queues, graphile_worker._private_tasks to ${ROLES.app};
  do $$
  declare queue_table text;
  begin
    for queue_table in select tablename from pg_tables where schemaname = 'graphile_worker' and rowsecurity loop
      execute format('drop policy if exists worker_runs on graphile_worker.%I', queue_table);
      execute format('create policy worker_runs on graphile_worker.%I to ${ROLES.worker} using (true) with check (true)', queue_table);
    end loop;
    foreach queue_table in array array['_private_jobs', '_private_job_queues', '_private_tasks'] loop
      execute format('drop policy if exists app_adds on graphile_worker.%I', queue_table);
      execute format('create policy app_adds on graphile_worker.%I to ${ROLES.app} using (true) with check (true)', queue_table);
    end loop;
  end $$;`

const quiet = new Logger(() => () => {})

/** Brings the queue's own tables up to date; `client` is the owner's connection. */
export async function migrateQueue(pool, client) {
  await runMigrations({ pgPool: pool, logger: quiet })
  await client.query('begin')
  await client.query(GRANTS)
  await client.query('commit')
}
