import type { QueryInterface } from 'sequelize'

/**
 * Work that follows a request (mail, for one): a row is written in the request's own transaction, so that it is there
 * exactly when the request was kept. `panel_id` is null for what belongs to a person and not to a panel.
 */
const up = `
create table jobs (
  id uuid primary key,
  panel_id uuid references panels (id),
  task text not null,
  data jsonb not null,
  run_at timestamptz not null,
  attempts integer not null default 0,
  failed_at timestamptz,
  last_error text,
  created_at timestamptz not null
);
create index jobs_due on jobs (run_at, id) where failed_at is null;
grant select, insert, update, delete on jobs to scrim_app;

-- Ending somebody's other sessions looks for all of theirs.
create index sessions_user on sessions ((sess #>> '{passport,user}'));
`

const down = `
drop index sessions_user;
drop table jobs;
`

export const jobs = {
  name: '0002-jobs',
  up: async ({ context }: { context: QueryInterface }): Promise<void> => {
    await context.sequelize.query(up)
  },
  down: async ({ context }: { context: QueryInterface }): Promise<void> => {
    await context.sequelize.query(down)
  },
}
