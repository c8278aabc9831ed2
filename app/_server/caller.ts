import type { Knex } from 'knex';
import { type Action, can, type Subject } from './policy';
import { Refusal } from './refusal';
import type { Viewer } from './viewer';

/** What every operation is handed: who asks, from where, and the data to ask about. */
export interface Caller {
  readonly database: Knex;
  readonly viewer: Viewer | null;
  /** The network address the request came from, if it is known. */
  readonly address: string | null;
}

/** The viewer, or a refusal when nobody is signed in. */
export function demandViewer({ viewer }: Caller): Viewer {
  if (!viewer) throw new Refusal({ code: 'not-signed-in' });
  return viewer;
}

/** Refuses what the policy does not allow. For subjects the viewer may know of: others are never found at all. */
export function demandPermission(viewer: Viewer, action: Action, subject: Subject): void {
  if (!can(viewer, action, subject)) throw new Refusal({ code: 'forbidden' });
}
