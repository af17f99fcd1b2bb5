import type { ForecastEvent, KindName } from '../../forecast/index.js';
import { localDateTime } from '../../time/index.js';
import { bodiesWords, circumstancesLine, kindTitles, seriesWords } from '../event-words.js';
import { tellInstant, uncertaintyShort } from '../uncertainty-words.js';
import type { EventRow } from './event-rows.js';

/** What happens, what is true of it, and the other moments of its meeting. */
export function EventCell({ row: { event, moments }, zone }: { row: EventRow; zone: string }) {
  const series = seriesWords([event, ...moments].find((moment) => moment.series !== null) ?? event);
  const notes = [series, event.certain ? null : 'grazing: another ephemeris may lack it'].filter(
    (note) => note !== null,
  );
  return (
    <>
      <strong>{bodiesWords(event)}</strong>, {kindTitles[event.kind]}
      {notes.length === 0 ? '' : ` (${notes.join('; ')})`}
      <br />
      <span class="place">{unbroken(circumstancesLine(event))}</span>
      {moments.length === 0 ? null : (
        <ul class="place">
          {moments.map((moment) => (
            <li key={moment.id}>{momentWords(moment, zone)}</li>
          ))}
        </ul>
      )}
    </>
  );
}

/** Numbers stay with their units. */
const unbroken = (line: string): string =>
  line.replace(/\bmag | (?=au\b)/g, (gap) => gap.replace(' ', '\u00a0'));

const shortTitles: Partial<Record<KindName, string>> = {
  'conjunction-ra': 'in right ascension',
  'conjunction-longitude': 'in longitude',
};

/** `in longitude 11 Feb 14:20, ± 8 min`, on the row's own clocks. */
function momentWords({ kind, utc, uncertaintySeconds }: ForecastEvent, zone: string): string {
  const date = localDateTime(utc, zone).toFormat('d LLL');
  const { time } = tellInstant(utc, uncertaintySeconds.utc, zone);
  return `${shortTitles[kind] ?? kindTitles[kind]} ${date}${time === '' ? '' : ` ${time}`}, ${uncertaintyShort(uncertaintySeconds.utc)}`;
}
