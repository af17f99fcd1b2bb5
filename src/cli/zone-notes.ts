import type { Site } from '../sky/index.js';

/** A zone that was looked up is a good guess, and the user should know that it is one. */
export const zoneNotes = (sites: readonly Site[]): string[] =>
  sites
    .filter(({ zoneFrom }) => zoneFrom === 'coordinates')
    .map(
      ({ name, zone }) =>
        `${name}: times of ${zone}, looked up from the coordinates; name the zone to have another`,
    );
