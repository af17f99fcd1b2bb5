import { CAUTION_ELONGATION_DEG, cautions, needsSunCaution } from '../cautions.js';
import type { ReportInput } from './report-input.js';

/** Said once, before the table that lists what happens near the Sun. */
export function Cautions({ forecast }: Pick<ReportInput, 'forecast'>) {
  const near = forecast.events.filter(needsSunCaution).length;
  return (
    <aside class="caution" aria-label="Safety">
      {near === 0 ? null : (
        <p>
          <strong>
            {near === 1 ? 'One of these events happens' : `${near} of these events happen`} within{' '}
            {CAUTION_ELONGATION_DEG}° of the Sun.
          </strong>{' '}
          {cautions.besideTheSun} {cautions.onTheDisc}
        </p>
      )}
      <p>{cautions.localRules}</p>
    </aside>
  );
}
