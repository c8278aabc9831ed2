import type { Knex } from 'knex';

/** The trigger function behind every table whose rows never change: it refuses, whoever asks. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create function refuse_change() returns trigger language plpgsql as $$
    begin
      raise exception '% of % is refused: its rows never change', tg_op, tg_table_name
        using errcode = 'restrict_violation';
    end
    $$`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop function refuse_change()');
}
