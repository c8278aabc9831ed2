import type { Knex } from 'knex';

/**
 * Recipes and their versions. Times are kept to the millisecond, which is all a JavaScript date holds: a cursor
 * made from one then compares equal to the row it came from.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table recipes (
      id uuid primary key default gen_random_uuid(),
      show_id uuid not null references shows,
      name text not null check (name ~ '^[a-z][a-z0-9_]{0,59}$'),
      title text not null check (char_length(title) between 1 and 120),
      created_by uuid not null references people,
      created_at timestamptz(3) not null default now(),
      changed_at timestamptz(3) not null default now(),
      latest_number integer,
      unique (show_id, name)
    )`);
  await knex.raw(`
    create table recipe_versions (
      recipe_id uuid not null references recipes,
      number integer not null check (number >= 1),
      parent integer,
      message text not null check (char_length(message) between 1 and 500),
      author_id uuid not null references people,
      text text not null,
      content_hash text not null
        check (content_hash = encode(sha256(convert_to(text, 'UTF8')), 'hex')),
      compiler_version text not null,
      errors integer not null check (errors >= 0),
      warnings integer not null check (warnings >= 0),
      state text not null default 'saved'
        check (state in ('saved', 'proposed', 'approved', 'issued', 'withdrawn')),
      created_at timestamptz(3) not null default now(),
      primary key (recipe_id, number),
      foreign key (recipe_id, parent) references recipe_versions (recipe_id, number),
      constraint recipe_versions_follow_on check (
        case when number = 1 then parent is null else parent is not null and parent = number - 1 end
      )
    )`);
  await knex.raw(`
    alter table recipes add constraint recipes_latest_exists
      foreign key (id, latest_number) references recipe_versions (recipe_id, number)
      deferrable initially deferred`);
  await knex.raw(`
    create trigger recipe_versions_never_change before update or delete on recipe_versions
      for each row execute function refuse_change()`);
  await knex.raw(`
    create trigger recipe_versions_never_vanish before truncate on recipe_versions
      for each statement execute function refuse_change()`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('alter table recipes drop constraint recipes_latest_exists');
  await knex.raw('drop table recipe_versions');
  await knex.raw('drop table recipes');
}
