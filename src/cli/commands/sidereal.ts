import { titleOf } from '../../bodies/index.js';
import { compassWords } from '../../sky/index.js';
import type { EquatorialPlace, Site } from '../../sky/index.js';
import { degreesMinutesSeconds, fixed, hoursWords, signed } from '../../output/index.js';
import { readInstant } from '../../plan/words/index.js';
import { utcMillis } from '../../time/index.js';
import { aligned } from '../aligned.js';
import { deliver } from '../deliver.js';
import type { DeliveryOptions } from '../deliver.js';
import { Faults } from '../faults.js';
import { readChoice } from '../read-choice.js';
import { readPosition } from '../read-position.js';
import { readSite } from '../read-site.js';
import type { SiteOptions } from '../read-site.js';
import { siderealMoment } from '../sidereal-moment.js';
import type { PositionAtMoment, SiderealMoment } from '../sidereal-moment.js';
import { zoneNotes } from '../zone-notes.js';

export interface SiderealOptions extends SiteOptions, DeliveryOptions {
  readonly at?: string;
  readonly position?: string;
  readonly format?: string;
}

export async function sidereal(options: SiderealOptions): Promise<void> {
  const faults = new Faults();
  const site = await readSite(options, faults);
  if (options.site === undefined) faults.add('--site', 'is missing: write LAT,LON like 48.2,11.6');
  const utc =
    options.at === undefined
      ? // The one place where the program asks what time it is.
        utcMillis(Date.now())
      : faults.take('--at', readInstant(options.at, site?.zone ?? null));
  const position =
    options.position === undefined ? undefined : faults.take('--position', readPosition(options.position));
  const format = readChoice('--format', options.format, ['table', 'json'], faults);
  faults.throwIfAny();

  const moment = siderealMoment(site!, utc!, position);
  deliver(
    format === 'json' ? json(site!, moment) : words(moment),
    [`sidereal time at ${site!.name}`, ...zoneNotes([site!])],
    options,
  );
}

const json = (site: Site, moment: SiderealMoment): string =>
  `${JSON.stringify({ schema: 'synodos-sidereal-1', site, ...moment }, null, 2)}\n`;

function words(moment: SiderealMoment): string {
  const times = aligned({
    header: ['sidereal time', 'mean', 'apparent'],
    rows: [
      ['local', hoursWords(moment.localMeanSiderealHours), hoursWords(moment.localApparentSiderealHours)],
      [
        'Greenwich',
        hoursWords(moment.greenwichMeanSiderealHours),
        hoursWords(moment.greenwichApparentSiderealHours),
      ],
    ],
  });
  const planets = aligned({
    header: ['by the meridian', 'hour angle', 'altitude', 'direction'],
    rows: moment.planets.map(({ body, hourAngleHours, altitudeDeg, azimuthDeg }) => [
      titleOf(body),
      `${signed(hourAngleHours, 2)} h`,
      `${fixed(altitudeDeg, 1)}°`,
      altitudeDeg < 0 ? 'below the horizon' : compassWords(azimuthDeg),
    ]),
  });
  const minutes = Math.floor(moment.siderealDayShorterSeconds / 60);
  const seconds = fixed(moment.siderealDayShorterSeconds - 60 * minutes, 1);
  return [
    `${moment.localTime} = ${moment.utc}\n`,
    times,
    `The sidereal day is ${minutes} min ${seconds} s shorter than the solar day: tomorrow the same stars come that much earlier.\n`,
    planets,
    ...(moment.position === null ? [] : [positionWords(moment.position)]),
  ].join('\n');
}

function positionWords(position: PositionAtMoment): string {
  const row = (name: string, place: EquatorialPlace): string[] => [
    name,
    hoursWords(place.rightAscensionHours),
    degreesMinutesSeconds(place.declinationDeg),
  ];
  return [
    aligned({
      header: ['position', 'right ascension', 'declination'],
      rows: [
        row('J2000.0', position.j2000),
        row('of date, mean equator', position.meanOfDate),
        row('of date, true equator', position.trueOfDate),
        row('back to J2000.0', position.backToJ2000),
      ],
    }),
    `hour angle ${signed(position.hourAngleHours, 3)} h\n`,
  ].join('');
}
