const points = [
  'north',
  'north-north-east',
  'north-east',
  'east-north-east',
  'east',
  'east-south-east',
  'south-east',
  'south-south-east',
  'south',
  'south-south-west',
  'south-west',
  'west-south-west',
  'west',
  'west-north-west',
  'north-west',
  'north-north-west',
] as const;

/** The nearest of the sixteen points of the compass, in words. */
export const compassWords = (azimuthDeg: number): string =>
  points[Math.round((((azimuthDeg % 360) + 360) % 360) / 22.5) % 16]!;
