import { titleOf } from '../../bodies/index.js';
import type { BodyCircumstances, PairCircumstances } from '../../forecast/index.js';
import { angleWords, fixed } from '../numbers.js';
import { Figure } from './figure.js';
import { PlanetDisc } from './planet-disc.js';
import { px } from './px.js';

const WIDTH = 320;
const RADIUS = 112;
const CENTRE = { x: WIDTH / 2, y: RADIUS + 22 };
const SCALE_Y = CENTRE.y + RADIUS + 16;
/** The discs as a telescope shows them, below the field: the larger one fills the room, but small ones stay small. */
const DISCS_Y = SCALE_Y + 54;
const LARGEST_DISC_PX = 48;
const MOST_PIXELS_PER_ARCSEC = 2.2;
const HEIGHT = DISCS_Y + 58;
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
  readonly legend: string;
  readonly tableId: string;
}

/** The smallest of the usual fields that holds two bodies with some room. */
export const fieldFor = (separationDeg: number): number =>
  FIELDS_DEG.find((field) => field >= separationDeg * 1.4) ?? FIELDS_DEG.at(-1)!;

/** Two bodies to scale in a round field, as they stand in the sky: north up, east left; beneath, their discs enlarged. */
export function CloseUp({ id, pair, title, finding, legend, tableId }: CloseUpProps) {
  const fieldDeg = fieldFor(pair.separationDeg);
  const pixelsPerDeg = (2 * RADIUS) / fieldDeg;
  const pixelsPerArcsec = Math.min(
    MOST_PIXELS_PER_ARCSEC,
    LARGEST_DISC_PX / Math.max(...pair.bodies.map(({ diameterArcsec }) => diameterArcsec)),
  );
  const angle = (pair.positionAngleDeg * Math.PI) / 180;
  // From the first body to the second: north is up, and position angle turns through east, which is left.
  const [east, north] = [Math.sin(angle) * pair.separationDeg, Math.cos(angle) * pair.separationDeg];
  const place = (part: number): Point => ({
    x: CENTRE.x - east * part * pixelsPerDeg,
    y: CENTRE.y - north * part * pixelsPerDeg,
  });
  return (
    <Figure
      {...{ id, title, finding, tableId }}
      width={WIDTH}
      height={HEIGHT}
      legend={<p class="note">{`${legend} The circle is a field of ${angleWords(fieldDeg)}.`}</p>}
    >
      <circle cx={CENTRE.x} cy={CENTRE.y} r={RADIUS} class="field" />
      <text x={CENTRE.x} y={14} class="middle quiet">
        north
      </text>
      <text x={2} y={CENTRE.y + 4} class="quiet">
        east
      </text>
      <Drift />
      <InField body={pair.bodies[0]} at={place(-0.5)} pixelsPerDeg={pixelsPerDeg} isUpper={north < 0} />
      <InField body={pair.bodies[1]} at={place(0.5)} pixelsPerDeg={pixelsPerDeg} isUpper={north >= 0} />
      <ScaleBar pixelsPerDeg={pixelsPerDeg} />
      <Enlarged body={pair.bodies[0]} x={WIDTH * 0.27} pixelsPerArcsec={pixelsPerArcsec} />
      <Enlarged body={pair.bodies[1]} x={WIDTH * 0.73} pixelsPerArcsec={pixelsPerArcsec} />
    </Figure>
  );
}

interface Point {
  readonly x: number;
  readonly y: number;
}

interface InFieldProps {
  readonly body: BodyCircumstances;
  readonly at: Point;
  readonly pixelsPerDeg: number;
  readonly isUpper: boolean;
}

/** At true size where that can be seen, else a point; the upper body's name above it, the lower one's below. */
function InField({ body, at, pixelsPerDeg, isUpper }: InFieldProps) {
  const diameter = (body.diameterArcsec / 3600) * pixelsPerDeg;
  const radius = Math.max(SMALLEST_DISC_PX, diameter) / 2;
  return (
    <g>
      <circle cx={px(at.x)} cy={px(at.y)} r={px(radius)} class="point" />
      <text x={px(at.x)} y={px(isUpper ? at.y - radius - 8 : at.y + radius + 17)} class="middle name inside">
        {titleOf(body.body)}
      </text>
    </g>
  );
}

/** Where the turning sky carries what is in the field: west. */
const Drift = () => (
  <g class="drift">
    <path d={`M${WIDTH - 30} ${CENTRE.y + RADIUS - 6}h26m-7 -4l7 4l-7 4`} />
    <text x={WIDTH - 36} y={CENTRE.y + RADIUS - 2} class="end quiet">
      drift
    </text>
  </g>
);

function ScaleBar({ pixelsPerDeg }: { pixelsPerDeg: number }) {
  const bar = BARS_ARCMIN.findLast((arcmin) => (arcmin / 60) * pixelsPerDeg < RADIUS * 0.7) ?? BARS_ARCMIN[0];
  const length = px((bar / 60) * pixelsPerDeg);
  return (
    <g class="scale">
      <path d={`M${px(CENTRE.x - length / 2)} ${SCALE_Y - 4}v4h${length}v-4`} />
      <text x={CENTRE.x} y={SCALE_Y + 16} class="middle">
        {bar}′
      </text>
    </g>
  );
}

interface EnlargedProps {
  readonly body: BodyCircumstances;
  readonly x: number;
  readonly pixelsPerArcsec: number;
}

/** A disc at the scale of both, with its size and how much of it is lit. */
function Enlarged({ body, x, pixelsPerArcsec }: EnlargedProps) {
  const { diameterArcsec, illuminatedFraction } = body;
  return (
    <g>
      <PlanetDisc
        body={body}
        x={x}
        y={DISCS_Y}
        radius={Math.max(1, (diameterArcsec * pixelsPerArcsec) / 2)}
      />
      <text x={x} y={DISCS_Y + 38} class="middle name">
        {titleOf(body.body)}
      </text>
      <text x={x} y={DISCS_Y + 54} class="middle quiet">
        {fixed(diameterArcsec, 1)}″, {fixed(illuminatedFraction * 100, 0)} % lit
      </text>
    </g>
  );
}
