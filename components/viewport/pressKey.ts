import type { CameraDesk, Standpoint } from './CameraDesk';

/** Standpoints with the key and the words for each. */
export const STANDPOINTS: readonly {
  readonly key: string;
  readonly standpoint: Standpoint;
  readonly words: string;
}[] = [
  { key: '1', standpoint: 'front', words: 'Front' },
  { key: '2', standpoint: 'side', words: 'Side' },
  { key: '3', standpoint: 'top', words: 'Top' },
  { key: '4', standpoint: 'free', words: 'Free' },
];

/** What keys can ask for beside turning, moving and coming nearer. */
export interface KeyTargets {
  stand(standpoint: Standpoint): void;
  frameAll(): void;
  frameChosen(): void;
  letGo(): void;
}

/** Degrees an arrow key turns, and the share of the picture it moves with shift. */
const TURN = 8;
const MOVE = 0.05;
const NEARER = 1.2;

/** Does what a key asks of the picture; false when the key means nothing here. */
export function pressKey(key: string, withShift: boolean, desk: CameraDesk, targets: KeyTargets): boolean {
  const stand = STANDPOINTS.find((candidate) => candidate.key === key);
  if (stand) {
    targets.stand(stand.standpoint);
    return true;
  }
  const go = (sideways: number, upwards: number): void => {
    if (withShift) desk.pan(sideways * MOVE, upwards * MOVE);
    else desk.orbit(sideways * TURN, upwards * TURN);
  };
  switch (key) {
    case 'ArrowLeft':
      go(-1, 0);
      return true;
    case 'ArrowRight':
      go(1, 0);
      return true;
    case 'ArrowUp':
      go(0, 1);
      return true;
    case 'ArrowDown':
      go(0, -1);
      return true;
    case '+':
    case '=':
      desk.approach(NEARER);
      return true;
    case '-':
      desk.approach(1 / NEARER);
      return true;
    case 'Home':
      targets.frameAll();
      return true;
    case 'End':
      targets.frameChosen();
      return true;
    case 'Escape':
      targets.letGo();
      return true;
    default:
      return false;
  }
}
