import type { Knex } from 'knex';

/** Builds may hold binary files; their text is then the bytes in base64, and size and hash are those of the bytes. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table build_files
      add column encoding text not null default 'utf8' check (encoding in ('utf8', 'base64')),
      drop constraint build_files_check,
      drop constraint build_files_check1`);
  await knex.raw(`
    create function build_file_bytes(text text, encoding text) returns bytea immutable language sql
      return case encoding when 'utf8' then convert_to(text, 'UTF8') else decode(text, 'base64') end`);
  await knex.raw(`
    alter table build_files
      add constraint build_files_bytes_match check (bytes = octet_length(build_file_bytes(text, encoding))),
      add constraint build_files_sha256_match
        check (sha256 = encode(sha256(build_file_bytes(text, encoding)), 'hex'))`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(
    `delete from builds where key in (select build_key from build_files where encoding <> 'utf8')`,
  );
  await knex.raw(`
    alter table build_files
      drop constraint build_files_bytes_match,
      drop constraint build_files_sha256_match,
      drop column encoding,
      add constraint build_files_check check (bytes = octet_length(convert_to(text, 'UTF8'))),
      add constraint build_files_check1 check (sha256 = encode(sha256(convert_to(text, 'UTF8')), 'hex'))`);
  await knex.raw('drop function build_file_bytes(text, text)');
}
