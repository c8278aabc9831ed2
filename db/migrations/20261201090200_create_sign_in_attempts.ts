import type { Knex } from 'knex';

/** Tries to sign in, kept for a day to slow guessing down. Addresses need not belong to anybody. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table sign_in_attempts (
      id bigint generated always as identity primary key,
      email text not null check (email = lower(email)),
      address inet,
      cleared boolean not null default false,
      at timestamptz(3) not null default now()
    )`);
  await knex.raw('create index sign_in_attempts_email_index on sign_in_attempts (email, at)');
  await knex.raw('create index sign_in_attempts_address_index on sign_in_attempts (address, at)');
  await knex.raw('create index sign_in_attempts_at_index on sign_in_attempts (at)');
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table sign_in_attempts');
}
