import { oneOf, quoted, readZone } from '../plan/words/index.js';
import { SiteError, makeSite } from '../sky/index.js';
import type { Site } from '../sky/index.js';
import type { Faults } from './faults.js';
import { readNumber } from './read-number.js';
import { UsageError } from './usage-error.js';

export interface SiteOptions {
  readonly site?: string;
  readonly zone?: string;
  readonly plan?: string;
}

const COORDINATES =
  'write LAT,LON or LAT,LON,ELEVATION, like 48.2,11.6,520, or the id of a site with --plan FILE';

/** Reads --site: coordinates (with --zone), or the id of a site of --plan. Undefined where no site was asked for. */
export async function readSite(options: SiteOptions, faults: Faults): Promise<Site | undefined> {
  if (options.site === undefined) {
    if (options.zone !== undefined) faults.add('--zone', 'stands alone: give the site with --site LAT,LON');
    if (options.plan !== undefined)
      faults.add('--plan', 'stands alone: name one of its sites with --site ID');
    return undefined;
  }
  // No id holds a comma.
  if (!options.site.includes(',')) return siteOfPlan(options.site, options, faults);
  if (options.plan !== undefined)
    faults.add('--plan', 'goes with the id of a site: coordinates need no plan');
  return siteOfCoordinates(options.site, options.zone, faults);
}

function siteOfCoordinates(words: string, zoneWord: string | undefined, faults: Faults): Site | undefined {
  const parts = words.split(',');
  const numbers = parts.map(readNumber).map((reading) => ('value' in reading ? reading.value : NaN));
  const [latitudeDeg = NaN, longitudeDeg = NaN, elevationM = 0] = numbers;
  const zone = zoneWord === undefined ? undefined : faults.take('--zone', readZone(zoneWord));
  if (parts.length < 2 || parts.length > 3 || numbers.some(Number.isNaN)) {
    faults.add('--site', `${quoted(words)} is not a place: ${COORDINATES}`);
    return undefined;
  }
  try {
    const name = `${latitudeDeg}, ${longitudeDeg}`;
    return makeSite({
      id: 'here',
      name,
      latitudeDeg,
      longitudeDeg,
      elevationM,
      ...(zone !== undefined && { zone }),
    });
  } catch (fault) {
    if (!(fault instanceof SiteError)) throw fault;
    faults.add('--site', fault.message);
    return undefined;
  }
}

async function siteOfPlan(id: string, options: SiteOptions, faults: Faults): Promise<Site | undefined> {
  if (options.zone !== undefined) {
    faults.add('--zone', 'goes with coordinates: a site of a plan has its zone there');
  }
  if (options.plan === undefined) {
    faults.add('--site', `${quoted(id)} is not a place: ${COORDINATES}`);
    return undefined;
  }
  const sites = await sitesOfPlan(options.plan, faults);
  if (sites === undefined) return undefined;
  const site = sites.find((candidate) => candidate.id === id);
  if (site !== undefined) return site;
  const ids = sites.map((candidate) => candidate.id);
  faults.add(
    '--site',
    `${quoted(id)} is the id of no site of ${options.plan}.${ids.length === 0 ? ' It has none' : oneOf(id, ids)}`,
  );
  return undefined;
}

/** The sites of a plan; undefined where the plan has faults, which are noted beside those of the command line. */
async function sitesOfPlan(file: string, faults: Faults): Promise<readonly Site[] | undefined> {
  const { planFrom } = await import('./plan-from.js');
  try {
    return (await planFrom(file)).sites;
  } catch (fault) {
    if (!(fault instanceof UsageError)) throw fault;
    faults.include(fault);
    return undefined;
  }
}
