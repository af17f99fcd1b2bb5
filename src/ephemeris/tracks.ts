import { bodies } from '../bodies/index.js';
import type { Body } from '../bodies/index.js';
import { rotate } from '../math/index.js';
import type { Jet, Rotation, Vector } from '../math/index.js';
import type { TtDays } from '../time/index.js';
import type { ApparentPlaces } from './apparent.js';
import { BlockCache } from './block-cache.js';
import { NodeSkies } from './node-skies.js';
import type { Frame, Motion, Paths } from './paths.js';
import { BlockFit, KEPT_BLOCKS, VectorTrack, fittedTrack } from './vector-track.js';
import type { BlockShape } from './vector-track.js';

/** Sixteen nodes in 32 days hold an apparent place to 0.004″ (Mercury) and 0.0001″ (the rest). */
const shape: BlockShape = { blockDays: 32, nodes: 16 };

type ByFrame<Value> = Readonly<Record<Frame, Value>>;

/**
 * The bodies' apparent paths as tracks: filled once where someone looks, then shared by everything. They leave out
 * the Sun's deflection of light, which no polynomial follows behind the Sun: search on tracks, decide on places.
 */
export class Tracks implements Paths {
  private readonly skies: NodeSkies;
  private readonly tracks: ReadonlyMap<Body, ByFrame<VectorTrack>>;
  private readonly axes: ByFrame<readonly [VectorTrack, VectorTrack, VectorTrack]>;
  /** Two bodies at one instant ask for the same turn, one after the other. */
  private lastTurn: { readonly tt: TtDays; readonly frame: Frame; readonly turn: Rotation } | null = null;

  constructor(private readonly places: ApparentPlaces) {
    this.skies = new NodeSkies(shape, places);
    this.tracks = new Map(bodies.map((body) => [body, this.tracksOf(body)]));
    this.axes = byFrame((frame) => this.axesOf(frame));
  }

  position(body: Body, frame: Frame, tt: TtDays): Vector {
    return this.tracks.get(body)![frame].position(tt);
  }

  motion(body: Body, frame: Frame, tt: TtDays): Motion {
    return this.tracks.get(body)![frame].motion(tt);
  }

  longitude(body: Body, frame: Frame, tt: TtDays): Jet {
    return this.tracks.get(body)![frame].longitude(tt);
  }

  /** The rotation from the axes of J2000.0 to a frame, from tracks of its rows. */
  rotation(frame: Frame, tt: TtDays): Rotation {
    if (this.lastTurn?.tt !== tt || this.lastTurn.frame !== frame) {
      const [x, y, z] = this.axes[frame];
      this.lastTurn = { tt, frame, turn: [x.position(tt), y.position(tt), z.position(tt)] };
    }
    return this.lastTurn.turn;
  }

  /** A body's place at a node is computed once and fitted on both kinds of axes. */
  private tracksOf(body: Body): ByFrame<VectorTrack> {
    const equator = new BlockFit(shape.nodes);
    const ecliptic = new BlockFit(shape.nodes);
    const blocks = new BlockCache((block): ByFrame<Float64Array> => {
      for (let node = 0; node < shape.nodes; node++) {
        const place = this.places.undeflected(body, this.skies.observer(block, node));
        equator.put(node, rotate(this.skies.turn('equator-of-date', block, node), place));
        ecliptic.put(node, rotate(this.skies.turn('ecliptic-of-date', block, node), place));
      }
      return { 'equator-of-date': equator.coefficients(), 'ecliptic-of-date': ecliptic.coefficients() };
    }, KEPT_BLOCKS);
    return byFrame((frame) => new VectorTrack(shape, (index) => blocks.get(index)[frame]));
  }

  private axesOf(frame: Frame): readonly [VectorTrack, VectorTrack, VectorTrack] {
    const row = (i: 0 | 1 | 2) => fittedTrack(shape, (block, node) => this.skies.turn(frame, block, node)[i]);
    return [row(0), row(1), row(2)];
  }
}

const byFrame = <Value>(value: (frame: Frame) => Value): ByFrame<Value> => ({
  'equator-of-date': value('equator-of-date'),
  'ecliptic-of-date': value('ecliptic-of-date'),
});
