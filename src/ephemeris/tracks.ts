import { bodies } from '../bodies/index.js';
import type { Body } from '../bodies/index.js';
import { rotate } from '../math/index.js';
import type { Jet, Rotation, Vector } from '../math/index.js';
import type { TtDays } from '../time/index.js';
import type { ApparentPlaces, Observer } from './apparent.js';
import { BlockCache } from './block-cache.js';
import { rotationTo } from './frames.js';
import type { Frame, Motion, Paths } from './paths.js';
import { VectorTrack, nodeTime } from './vector-track.js';
import type { BlockShape } from './vector-track.js';

/** Sixteen nodes in 32 days hold an apparent place to 0.004″ (Mercury) and 0.0001″ (the rest). */
const shape: BlockShape = { blockDays: 32, nodes: 16 };
const KEPT_BLOCKS = 2048;

/**
 * The bodies' apparent paths as tracks: filled once where someone looks, then shared by everything. They leave out
 * the Sun's deflection of light, which no polynomial follows behind the Sun: search on tracks, decide on places.
 */
export class Tracks implements Paths {
  /** Where the Earth is at the nodes of a block: the same for all bodies. */
  private readonly observers: BlockCache<readonly Observer[]>;
  private readonly tracks: Readonly<Record<Frame, ReadonlyMap<Body, VectorTrack>>>;
  private readonly axes: Readonly<Record<Frame, readonly [VectorTrack, VectorTrack, VectorTrack]>>;

  constructor(private readonly places: ApparentPlaces) {
    this.observers = perNode((tt) => places.observer(tt));
    const nodePlaces = new Map(bodies.map((body) => [body, this.nodePlaces(body)]));
    const turns = eachFrame((frame) => perNode((tt) => rotationTo(frame, tt)));
    this.tracks = eachFrame(
      (frame) => new Map(bodies.map((body) => [body, trackOf(nodePlaces.get(body)!, turns[frame])])),
    );
    this.axes = eachFrame((frame) => {
      const row = (i: 0 | 1 | 2) =>
        new VectorTrack(shape, (_tt, node, block) => turns[frame].get(block)[node]![i]);
      return [row(0), row(1), row(2)];
    });
  }

  position(body: Body, frame: Frame, tt: TtDays): Vector {
    return this.tracks[frame].get(body)!.position(tt);
  }

  motion(body: Body, frame: Frame, tt: TtDays): Motion {
    return this.tracks[frame].get(body)!.motion(tt);
  }

  longitude(body: Body, frame: Frame, tt: TtDays): Jet {
    return this.tracks[frame].get(body)!.longitude(tt);
  }

  /** The rotation from the axes of J2000.0 to a frame, from tracks of its rows. */
  rotation(frame: Frame, tt: TtDays): Rotation {
    const [x, y, z] = this.axes[frame];
    return [x.position(tt), y.position(tt), z.position(tt)];
  }

  /** A body's places at the nodes on the axes of J2000.0: computed once, then turned into every frame asked for. */
  private nodePlaces(body: Body): BlockCache<readonly Vector[]> {
    return perNode((_tt, node, block) => this.places.undeflected(body, this.observers.get(block)[node]!));
  }
}

function eachFrame<Value>(value: (frame: Frame) => Value): Readonly<Record<Frame, Value>> {
  return {
    j2000: value('j2000'),
    'equator-of-date': value('equator-of-date'),
    'ecliptic-of-date': value('ecliptic-of-date'),
  };
}

function perNode<Value>(
  value: (tt: TtDays, node: number, block: number) => Value,
): BlockCache<readonly Value[]> {
  return new BlockCache(
    (block) =>
      Array.from({ length: shape.nodes }, (_, node) => value(nodeTime(shape, block, node), node, block)),
    KEPT_BLOCKS,
  );
}

function trackOf(places: BlockCache<readonly Vector[]>, turns: BlockCache<readonly Rotation[]>): VectorTrack {
  return new VectorTrack(shape, (_tt, node, block) =>
    rotate(turns.get(block)[node]!, places.get(block)[node]!),
  );
}
