import type { Knex } from 'knex';

export type RoleName = 'admin' | 'reviewer' | 'rigger' | 'operator' | 'viewer';
export type VersionStateName = 'saved' | 'proposed' | 'approved' | 'issued' | 'withdrawn';

export interface PersonRow {
  readonly id: string;
  readonly email: string;
  readonly name: string;
  readonly password_hash: string;
  readonly created_at: Date;
}

export interface SignInAttemptRow {
  /** bigint, as text. */
  readonly id: string;
  readonly email: string;
  readonly address: string | null;
  /** A later try from the same address was right. */
  readonly cleared: boolean;
  readonly at: Date;
}

export interface ShowRow {
  readonly id: string;
  readonly slug: string;
  readonly title: string;
  readonly created_at: Date;
}

export interface MembershipRow {
  readonly person_id: string;
  readonly show_id: string;
  readonly role: RoleName;
  readonly created_at: Date;
}

export interface RecipeRow {
  readonly id: string;
  readonly show_id: string;
  readonly name: string;
  readonly title: string;
  readonly created_by: string;
  readonly created_at: Date;
  readonly changed_at: Date;
  /** Null only inside the transaction that creates the recipe. */
  readonly latest_number: number | null;
}

export interface RecipeVersionRow {
  readonly recipe_id: string;
  readonly number: number;
  readonly parent: number | null;
  readonly message: string;
  readonly author_id: string;
  readonly text: string;
  readonly content_hash: string;
  readonly compiler_version: string;
  readonly errors: number;
  readonly warnings: number;
  readonly state: VersionStateName;
  readonly created_at: Date;
}

export interface RecipeDraftRow {
  readonly person_id: string;
  readonly recipe_id: string;
  readonly based_on: number;
  readonly text: string;
  /** bigint, as text. */
  readonly revision: string;
  readonly updated_at: Date;
}

export interface BuildRow {
  readonly key: string;
  readonly character: string;
  readonly manifest: unknown;
  readonly created_at: Date;
}

export interface BuildFileRow {
  readonly build_key: string;
  readonly position: number;
  readonly name: string;
  readonly media_type: string;
  /** The file's text, or its bytes in base64. */
  readonly text: string;
  readonly encoding: 'utf8' | 'base64';
  readonly bytes: number;
  readonly sha256: string;
}

export interface AuditLogRow {
  /** bigint, as text. */
  readonly id: string;
  readonly at: Date;
  readonly person_id: string | null;
  readonly action: string;
  readonly subject_type: string;
  readonly subject_id: string | null;
  readonly show_id: string | null;
  readonly address: string | null;
  readonly details: unknown;
}

export interface IdempotencyKeyRow {
  readonly person_id: string;
  readonly key: string;
  readonly request_hash: string;
  readonly answer: unknown;
  readonly created_at: Date;
}

/** A table whose rows are written with the named columns left to their defaults. */
type Table<Row, Defaulted extends keyof Row> = Knex.CompositeTableType<
  Row,
  Omit<Row, Defaulted> & Partial<Pick<Row, Defaulted>>,
  { readonly [Column in keyof Row]?: Row[Column] | Knex.Raw }
>;

declare module 'knex/types/tables.js' {
  interface Tables {
    people: Table<PersonRow, 'id' | 'created_at'>;
    sign_in_attempts: Table<SignInAttemptRow, 'id' | 'cleared' | 'at'>;
    shows: Table<ShowRow, 'id' | 'created_at'>;
    memberships: Table<MembershipRow, 'created_at'>;
    recipes: Table<RecipeRow, 'id' | 'created_at' | 'changed_at' | 'latest_number'>;
    recipe_versions: Table<RecipeVersionRow, 'state' | 'created_at'>;
    recipe_drafts: Table<RecipeDraftRow, 'revision' | 'updated_at'>;
    builds: Table<BuildRow, 'created_at'>;
    build_files: Table<BuildFileRow, never>;
    audit_log: Table<AuditLogRow, 'id' | 'at'>;
    idempotency_keys: Table<IdempotencyKeyRow, 'created_at'>;
  }
}
