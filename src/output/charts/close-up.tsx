import { titleOf } from '../../bodies/index.js';
import type { BodyCircumstances, PairCircumstances } from '../../forecast/index.js';
import { angleWords } from '../numbers.js';
import { Figure } from './figure.js';

const SIZE = 300;
const RADIUS = 132;
const CENTRE = SIZE / 2;
const SMALLEST_DISC_PX = 4;
/** Fields that people look through: a telescope's at high and low power, large and small binoculars. */
const FIELDS_DEG = [0.5, 1, 2.5, 4, 6.5] as const;
/** Round lengths for the scale bar, arcminutes. */
const BARS_ARCMIN = [1, 2, 5, 10, 20, 30, 60, 120] as const;

interface CloseUpProps {
  readonly id: string;
  readonly pair: PairCircumstances;
  readonly title: string;
  readonly finding: string;
  readonly tableId: string;
}

/** The smallest of the usual fields that holds two bodies with some room. */
const fieldFor = (separationDeg: number): number =>
  FIELDS_DEG.find((field) => field >= separationDeg * 1.4) ?? FIELDS_DEG.at(-1)!;

/** Two bodies to scale in a round field, as they stand in the sky: north up, east left. */
export function CloseUp({ id, pair, title, finding, tableId }: CloseUpProps) {
  const fieldDeg = fieldFor(pair.separationDeg);
  const pixelsPerDeg = (2 * RADIUS) / fieldDeg;
  const angle = (pair.positionAngleDeg * Math.PI) / 180;
  // From the first body to the second: north is up, and position angle turns through east, which is left.
  const [east, north] = [Math.sin(angle) * pair.separationDeg, Math.cos(angle) * pair.separationDeg];
  const place = (part: number) => ({
    x: CENTRE - east * part * pixelsPerDeg,
    y: CENTRE - north * part * pixelsPerDeg,
  });
  const bar = BARS_ARCMIN.findLast((arcmin) => (arcmin / 60) * pixelsPerDeg < RADIUS * 0.7) ?? BARS_ARCMIN[0];
  const barPixels = (bar / 60) * pixelsPerDeg;
  return (
    <Figure
      id={id}
      title={title}
      finding={finding}
      width={SIZE}
      height={SIZE + 34}
      tableId={tableId}
      legend={`${finding} The circle is a field of ${angleWords(fieldDeg)}.`}
    >
      <circle cx={CENTRE} cy={CENTRE} r={RADIUS} class="field" />
      <text x={CENTRE} y={14} class="middle">
        north
      </text>
      <text x={4} y={CENTRE - 6}>
        E
      </text>
      <g class="drift">
        <path d={`M${CENTRE + RADIUS - 34} ${CENTRE + RADIUS - 8}h30m-7 -4l7 4l-7 4`} />
        <text x={CENTRE + RADIUS - 36} y={CENTRE + RADIUS - 4} class="end">
          drift
        </text>
      </g>
      <Disc body={pair.bodies[0]} at={place(-0.5)} pixelsPerDeg={pixelsPerDeg} />
      <Disc body={pair.bodies[1]} at={place(0.5)} pixelsPerDeg={pixelsPerDeg} />
      <g class="scale">
        <line x1={CENTRE - barPixels / 2} x2={CENTRE + barPixels / 2} y1={SIZE + 10} y2={SIZE + 10} />
        <text x={CENTRE} y={SIZE + 28} class="middle">
          {bar}′
        </text>
      </g>
    </Figure>
  );
}

interface DiscProps {
  readonly body: BodyCircumstances;
  readonly at: { readonly x: number; readonly y: number };
  readonly pixelsPerDeg: number;
}

/** At true size where that can be seen, else a point. */
function Disc({ body, at, pixelsPerDeg }: DiscProps) {
  const diameter = (body.diameterArcsec / 3600) * pixelsPerDeg;
  const radius = Math.max(SMALLEST_DISC_PX, diameter) / 2;
  const right = at.x > CENTRE;
  return (
    <g>
      <circle cx={round(at.x)} cy={round(at.y)} r={round(radius)} class="disc" />
      <text
        x={round(at.x + (right ? -1 : 1) * (radius + 7))}
        y={round(at.y - 7)}
        class={right ? 'end name' : 'name'}
      >
        {titleOf(body.body)}
      </text>
    </g>
  );
}

const round = (value: number): number => Math.round(value * 10) / 10;
