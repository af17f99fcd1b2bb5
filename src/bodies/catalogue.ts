/** The Sun and the planets, from the inside out. Pluto is kept with them because the mean elements are. */
export const planets = [
  'mercury',
  'venus',
  'earth',
  'mars',
  'jupiter',
  'saturn',
  'uranus',
  'neptune',
  'pluto',
] as const;

export type Planet = (typeof planets)[number];
export type Body = 'sun' | Planet;
/** A planet that can be seen in the Earth's sky. */
export type SkyPlanet = Exclude<Planet, 'earth'>;

export const bodies: readonly Body[] = ['sun', ...planets];
export const skyPlanets = planets.filter((planet): planet is SkyPlanet => planet !== 'earth');
/** The bodies that a forecast covers when the user names none: the eight planets. */
export const majorPlanets: readonly Planet[] = planets.filter((planet) => planet !== 'pluto');

export const isInner = (planet: Planet): boolean => planet === 'mercury' || planet === 'venus';
export const isBody = (name: string): name is Body => (bodies as readonly string[]).includes(name);

interface BodyFacts {
  /** The name as it is written in a sentence. */
  readonly title: string;
  /** Equatorial radius, km. Source: Archinal et al., Celest. Mech. Dyn. Astr. 130 (2018) 22 (IAU WGCCRE 2015). */
  readonly equatorialRadiusKm: number;
}

export const bodyFacts: Readonly<Record<Body, BodyFacts>> = {
  sun: { title: 'Sun', equatorialRadiusKm: 695_700 },
  mercury: { title: 'Mercury', equatorialRadiusKm: 2440.53 },
  venus: { title: 'Venus', equatorialRadiusKm: 6051.8 },
  earth: { title: 'Earth', equatorialRadiusKm: 6378.1366 },
  mars: { title: 'Mars', equatorialRadiusKm: 3396.19 },
  jupiter: { title: 'Jupiter', equatorialRadiusKm: 71_492 },
  saturn: { title: 'Saturn', equatorialRadiusKm: 60_268 },
  uranus: { title: 'Uranus', equatorialRadiusKm: 25_559 },
  neptune: { title: 'Neptune', equatorialRadiusKm: 24_764 },
  pluto: { title: 'Pluto', equatorialRadiusKm: 1188.3 },
};

export const titleOf = (body: Body): string => bodyFacts[body].title;
