/** Widths of the book count characters of the standard font; that font's digits are 7 pixels wide, with 5 around. */
export const pixelsOfCharacters = (characters: number): number => Math.round(characters * 7 + 5);

export const charactersOfPixels = (pixels: number): number => Math.round(((pixels - 5) / 7) * 100) / 100;

/** Heights of the book are points of 1/72 inch; a pixel is 1/96. */
export const pixelsOfPoints = (points: number): number => Math.round((points * 4) / 3);

export const pointsOfPixels = (pixels: number): number => Math.round(pixels * 0.75 * 100) / 100;
