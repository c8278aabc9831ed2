import type { Knex } from 'knex';
import '../tables';

export interface StoredBuildFile {
  readonly name: string;
  readonly mediaType: string;
  readonly bytes: number;
  readonly sha256: string;
}

export interface StoredBuild {
  readonly key: string;
  readonly character: string;
  readonly files: readonly StoredBuildFile[];
}

/** A file with what it holds: its text, or its bytes in base64. */
export interface StoredBuildFileText extends StoredBuildFile {
  readonly text: string;
  readonly encoding: 'utf8' | 'base64';
}

/** Builds by the hash of everything that went in. */
export function buildsRepository(database: Knex) {
  return {
    /** A build and its list of files, without their texts. */
    async find(key: string): Promise<StoredBuild | undefined> {
      const build = await database('builds').where({ key }).first('key', 'character');
      if (!build) return undefined;
      const files = await database('build_files')
        .where({ build_key: key })
        .orderBy('position')
        .select('name', 'media_type as mediaType', 'bytes', 'sha256');
      return { ...build, files };
    },

    /** The files of a build with their texts, in order. */
    async readFiles(key: string): Promise<readonly StoredBuildFileText[]> {
      return database('build_files')
        .where({ build_key: key })
        .orderBy('position')
        .select('name', 'media_type as mediaType', 'bytes', 'sha256', 'text', 'encoding');
    },

    /** One file of a build. */
    async readFile(key: string, name: string): Promise<StoredBuildFileText | undefined> {
      return database('build_files')
        .where({ build_key: key, name })
        .first('name', 'media_type as mediaType', 'bytes', 'sha256', 'text', 'encoding');
    },

    /** Keeps a build unless it is there already: the same key always stands for the same files. */
    async insertIfAbsent(build: {
      readonly key: string;
      readonly character: string;
      readonly manifest: unknown;
      readonly files: readonly StoredBuildFileText[];
    }): Promise<void> {
      await database.transaction(async (transaction) => {
        const inserted = await transaction('builds')
          .insert({
            key: build.key,
            character: build.character,
            manifest: JSON.stringify(build.manifest),
          })
          .onConflict('key')
          .ignore()
          .returning('key');
        if (inserted.length === 0) return;
        await transaction('build_files').insert(
          build.files.map((file, position) => ({
            build_key: build.key,
            position,
            name: file.name,
            media_type: file.mediaType,
            text: file.text,
            encoding: file.encoding,
            bytes: file.bytes,
            sha256: file.sha256,
          })),
        );
      });
    },
  };
}
