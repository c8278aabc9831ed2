'use client';

import type { Standpoint } from './CameraDesk';
import type { Audience } from './drawing';
import { STANDPOINTS } from './pressKey';

export interface ViewBarProps {
  readonly audience: Audience;
  readonly hasChosen: boolean;
  stand(standpoint: Standpoint): void;
  frameAll(): void;
  frameChosen(): void;
  onAudience(audience: Audience): void;
}

/** What a pointer can ask of the picture, in words; keys ask for the same. */
export function ViewBar({ audience, hasChosen, stand, frameAll, frameChosen, onAudience }: ViewBarProps) {
  return (
    <div className="flex flex-wrap items-center gap-x-4 gap-y-1 border-rule border-b px-3 py-1 text-sm">
      {STANDPOINTS.map(({ standpoint, words, key }) => (
        <button
          key={standpoint}
          type="button"
          className="plain-action"
          aria-keyshortcuts={key}
          onClick={() => stand(standpoint)}
        >
          {words}
        </button>
      ))}
      <button type="button" className="plain-action" aria-keyshortcuts="Home" onClick={frameAll}>
        Whole rig
      </button>
      <button
        type="button"
        className="plain-action"
        aria-keyshortcuts="End"
        disabled={!hasChosen}
        onClick={frameChosen}
      >
        Chosen
      </button>
      <label className="ml-auto flex items-center gap-2">
        As seen by
        <select
          className="plain-select"
          value={audience}
          onChange={(event) => onAudience(event.target.value === 'animator' ? 'animator' : 'rigger')}
        >
          <option value="rigger">the rigger</option>
          <option value="animator">the animator</option>
        </select>
      </label>
    </div>
  );
}
