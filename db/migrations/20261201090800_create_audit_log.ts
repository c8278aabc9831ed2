import type { Knex } from 'knex';

/** Who did what from where; only ever added to. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table audit_log (
      id bigint generated always as identity primary key,
      at timestamptz(3) not null default now(),
      person_id uuid references people,
      action text not null check (action ~ '^[a-z]+(\\.[a-z]+)+$'),
      subject_type text not null,
      subject_id uuid,
      show_id uuid references shows,
      address inet,
      details jsonb not null default '{}'
    )`);
  await knex.raw('create index audit_log_by_show on audit_log (show_id, id)');
  await knex.raw('create index audit_log_by_person on audit_log (person_id, id)');
  await knex.raw(`
    create trigger audit_log_never_changes before update or delete on audit_log
      for each row execute function refuse_change()`);
  await knex.raw(`
    create trigger audit_log_never_vanishes before truncate on audit_log
      for each statement execute function refuse_change()`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table audit_log');
}
