import { CanvasTexture, SRGBColorSpace } from 'three';

const SIZE = 64;
/** Widths of lines, as shares of the texture. */
const RING = 0.14;
const CASING = 0.22;

export type RingKind = 'ring' | 'broken' | 'ringCasing' | 'brokenCasing' | 'disc';

/**
 * A white circle on nothing, to be tinted: open for a joint, broken for the right side, either wider as the ink
 * around it, or a filled disc.
 */
export function ringTexture(kind: RingKind): CanvasTexture {
  const canvas = document.createElement('canvas');
  canvas.width = SIZE;
  canvas.height = SIZE;
  const context = canvas.getContext('2d');
  if (context) {
    context.fillStyle = '#ffffff';
    context.strokeStyle = '#ffffff';
    context.lineWidth = SIZE * (kind === 'ring' || kind === 'broken' ? RING : CASING);
    if (kind === 'broken' || kind === 'brokenCasing') context.setLineDash([SIZE * 0.2, SIZE * 0.13]);
    context.beginPath();
    context.arc(SIZE / 2, SIZE / 2, SIZE * 0.36, 0, Math.PI * 2);
    if (kind === 'disc') context.fill();
    else context.stroke();
  }
  const texture = new CanvasTexture(canvas);
  texture.colorSpace = SRGBColorSpace;
  return texture;
}
