import type { Knex } from 'knex';

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table shows (
      id uuid primary key default gen_random_uuid(),
      slug text not null unique check (slug ~ '^[a-z][a-z0-9_]{0,63}$'),
      title text not null check (char_length(title) between 1 and 120),
      created_at timestamptz(3) not null default now()
    )`);
  await knex.raw(`
    create table memberships (
      person_id uuid not null references people,
      show_id uuid not null references shows,
      role text not null check (role in ('admin', 'reviewer', 'rigger', 'operator', 'viewer')),
      created_at timestamptz(3) not null default now(),
      primary key (person_id, show_id, role)
    )`);
  await knex.raw('create index memberships_show_index on memberships (show_id)');
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table memberships');
  await knex.raw('drop table shows');
}
