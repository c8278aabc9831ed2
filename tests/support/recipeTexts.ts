import { samples } from '@/compiler/index';

/** A recipe that compiles without findings. */
export const SOUND_TEXT = samples.find(({ id }) => id === 'mail_cart')?.text ?? '';

/** A recipe whose compile gives errors. */
export const BROKEN_TEXT = 'format: 1\nrecipe: broken\nchains: { arm: { points: [nowhere, either] } }\n';
