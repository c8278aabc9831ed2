import type { Knex } from 'knex';

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table people (
      id uuid primary key default gen_random_uuid(),
      email text not null check (char_length(email) between 3 and 254 and email like '_%@_%'),
      name text not null check (char_length(name) between 1 and 120),
      password_hash text not null,
      created_at timestamptz(3) not null default now()
    )`);
  await knex.raw('create unique index people_email_key on people (lower(email))');
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table people');
}
