import { strToU8, type Zippable, zipSync } from 'fflate';
import { makeConformanceKit, sha256Hex } from '@/compiler/index';

/** The first day a ZIP entry can carry. A fixed one, so that the kit is the same archive byte for byte. */
const ENTRY_TIME = new Date(1980, 0, 1);

export interface ConformanceKitArchive {
  readonly bytes: Uint8Array<ArrayBuffer>;
  /** SHA-256 of the names and texts in it. */
  readonly hash: string;
}

let archive: ConformanceKitArchive | null = null;

/** The conformance kit in one ZIP archive; made when first asked for, since it is the same for everyone. */
export function readConformanceKit(): ConformanceKitArchive {
  if (archive) return archive;
  const files = makeConformanceKit();
  const entries: Zippable = {};
  for (const { name, text } of files) entries[name] = [strToU8(text), { mtime: ENTRY_TIME, level: 6 }];
  const hash = sha256Hex(JSON.stringify(files.map(({ name, text }) => [name, text])));
  archive = { bytes: zipSync(entries) as Uint8Array<ArrayBuffer>, hash };
  return archive;
}
