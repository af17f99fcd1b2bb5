/** The closed list of kinds, in the order in which they are told at the same instant. */
export const kindNames = [
  'opposition',
  'conjunction',
  'inferior-conjunction',
  'superior-conjunction',
  'east-quadrature',
  'west-quadrature',
  'greatest-elongation-east',
  'greatest-elongation-west',
  'stationary-retrograde',
  'stationary-direct',
  'closest-approach',
  'farthest',
  'perihelion',
  'aphelion',
  'greatest-brilliancy',
  'conjunction-ra',
  'conjunction-longitude',
  'appulse',
  'heliocentric-conjunction',
  'heliocentric-opposition',
] as const;

export type KindName = (typeof kindNames)[number];
