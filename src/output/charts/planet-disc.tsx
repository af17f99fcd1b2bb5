import type { BodyCircumstances } from '../../forecast/index.js';
import { brightLimbAngle } from './bright-limb.js';
import { px } from './px.js';

interface PlanetDiscProps {
  readonly body: BodyCircumstances;
  readonly x: number;
  readonly y: number;
  readonly radius: number;
}

/** A planet's disc with its phase, north up and east left. */
export function PlanetDisc({ body, x, y, radius }: PlanetDiscProps) {
  return (
    <g transform={`translate(${px(x)} ${px(y)})`}>
      <circle r={px(radius)} class="unlit" />
      <path
        d={litShape(radius, body.illuminatedFraction)}
        transform={`rotate(${limbTurnDeg(body)})`}
        class="lit"
      />
      <circle r={px(radius)} class="limb" />
    </g>
  );
}

/** The lit part with its bright limb upwards: a half circle, and the terminator as half an ellipse. */
function litShape(radius: number, illuminatedFraction: number): string {
  const r = px(radius);
  const waist = px(radius * Math.abs(2 * illuminatedFraction - 1));
  const bulge = illuminatedFraction > 0.5 ? 1 : 0;
  return `M${-r} 0A${r} ${r} 0 0 1 ${r} 0A${r} ${waist} 0 0 ${bulge} ${-r} 0Z`;
}

/** North up, east left: a position angle turns against the clock, and SVG turns with it. */
const limbTurnDeg = (body: BodyCircumstances): number => px((-brightLimbAngle(body) * 180) / Math.PI);
