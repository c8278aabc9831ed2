/**
 * The migration a database must have for this code to run on it. The built application has no migration files
 * to list, so the name stands here; a test compares it with the folder.
 */
export const NEWEST_MIGRATION = '20261201091000_store_binary_build_files.ts';
