import type { ForecastEvent } from '../../forecast/index.js';
import { isoUtc, zoneAbbreviation } from '../../time/index.js';
import { isObservable } from '../headline.js';
import { tellInstant, uncertaintyShort } from '../uncertainty-words.js';
import { SkySign } from './sky-sign.js';

interface WhenCellProps {
  readonly event: ForecastEvent;
  readonly zone: string;
}

/** Date, clock time and how sure they are; of a sight also its part of the night. */
export function WhenCell({ event, zone }: WhenCellProps) {
  const { utc, uncertaintySeconds } = event;
  const { isoDate, weekday, time } = tellInstant(utc, uncertaintySeconds.utc, zone);
  return (
    <>
      <time class="nowrap" dateTime={isoUtc(utc)}>
        {isoDate} {weekday}
      </time>
      <br />
      <span class="place">
        {time === '' ? '' : `${time} ${zoneAbbreviation(utc, zone)}, `}
        <span class="nowrap">{uncertaintyShort(uncertaintySeconds.utc)}</span>
      </span>
      {isObservable(event) ? <SkySign event={event} /> : null}
    </>
  );
}
