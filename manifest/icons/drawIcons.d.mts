export const SIZES: readonly number[];
export function drawMark(size: number): Uint8Array;
export function markSvg(): string;
