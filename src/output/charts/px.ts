/** A tenth of a pixel is finer than any screen, and keeps the page small. */
export const px = (value: number): number => Math.round(value * 10) / 10;
