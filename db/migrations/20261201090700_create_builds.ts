import type { Knex } from 'knex';

/** Builds by the hash of everything that went in. Rows may be dropped to save room, never altered. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table builds (
      key text primary key check (key ~ '^[0-9a-f]{64}$'),
      character text not null,
      manifest jsonb not null,
      created_at timestamptz(3) not null default now()
    )`);
  await knex.raw(`
    create table build_files (
      build_key text not null references builds on delete cascade,
      position integer not null check (position >= 0),
      name text not null check (name !~ '[/\\\\]' and char_length(name) between 1 and 200),
      media_type text not null,
      text text not null,
      bytes integer not null check (bytes = octet_length(convert_to(text, 'UTF8'))),
      sha256 text not null check (sha256 = encode(sha256(convert_to(text, 'UTF8')), 'hex')),
      primary key (build_key, name),
      unique (build_key, position)
    )`);
  await knex.raw(`
    create trigger builds_never_change before update on builds
      for each row execute function refuse_change()`);
  await knex.raw(`
    create trigger build_files_never_change before update on build_files
      for each row execute function refuse_change()`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table build_files');
  await knex.raw('drop table builds');
}
