import { CanvasTexture, SRGBColorSpace } from 'three';

const SIZE = 64;

/** A white circle on nothing, to be tinted: open for a joint, broken for the right side, or a filled disc. */
export function ringTexture(kind: 'ring' | 'broken' | 'disc'): CanvasTexture {
  const canvas = document.createElement('canvas');
  canvas.width = SIZE;
  canvas.height = SIZE;
  const context = canvas.getContext('2d');
  if (context) {
    context.fillStyle = '#ffffff';
    context.strokeStyle = '#ffffff';
    context.lineWidth = SIZE * 0.14;
    if (kind === 'broken') context.setLineDash([SIZE * 0.2, SIZE * 0.13]);
    context.beginPath();
    context.arc(SIZE / 2, SIZE / 2, SIZE * (kind === 'disc' ? 0.42 : 0.38), 0, Math.PI * 2);
    if (kind === 'disc') context.fill();
    else context.stroke();
  }
  const texture = new CanvasTexture(canvas);
  texture.colorSpace = SRGBColorSpace;
  return texture;
}
