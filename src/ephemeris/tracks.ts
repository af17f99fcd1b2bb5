import type { Body } from '../bodies/index.js';
import { rotate } from '../math/index.js';
import type { Rotation, Vector } from '../math/index.js';
import type { TtDays } from '../time/index.js';
import type { ApparentPlaces } from './apparent.js';
import { BlockCache } from './block-cache.js';
import { rotationTo } from './frames.js';
import type { Frame, Motion, Paths } from './paths.js';
import { VectorTrack, nodeTimes } from './vector-track.js';
import type { BlockShape } from './vector-track.js';

/** Sixteen nodes in 32 days hold an apparent place to 0.004″ (Mercury) and 0.0001″ (the rest). */
const shape: BlockShape = { blockDays: 32, nodes: 16 };
const KEPT_ROTATIONS = 2048;

/**
 * The bodies' apparent paths as tracks: filled once where someone looks, then shared by everything. They leave out
 * the Sun's deflection of light, which no polynomial follows behind the Sun: search on tracks, decide on places.
 */
export class Tracks implements Paths {
  private readonly tracks = new Map<string, VectorTrack>();
  private readonly rotations = new Map<Frame, BlockCache<readonly Rotation[]>>();

  constructor(private readonly places: ApparentPlaces) {}

  position(body: Body, frame: Frame, tt: TtDays): Vector {
    return this.track(body, frame).position(tt);
  }

  motion(body: Body, frame: Frame, tt: TtDays): Motion {
    return this.track(body, frame).motion(tt);
  }

  private track(body: Body, frame: Frame): VectorTrack {
    const key = `${body} ${frame}`;
    let track = this.tracks.get(key);
    if (track === undefined) {
      const rotations = this.rotationsTo(frame);
      track = new VectorTrack(shape, (nodes, index) => {
        const turns = rotations.get(index);
        return nodes.map((tt, k) => rotate(turns[k]!, this.places.undeflected(body, tt)));
      });
      this.tracks.set(key, track);
    }
    return track;
  }

  /** The nodes are the same for all bodies, and so are the turns of the axes at them. */
  private rotationsTo(frame: Frame): BlockCache<readonly Rotation[]> {
    let cache = this.rotations.get(frame);
    if (cache === undefined) {
      cache = new BlockCache(
        (index) => nodeTimes(shape, index).map((tt) => rotationTo(frame, tt)),
        KEPT_ROTATIONS,
      );
      this.rotations.set(frame, cache);
    }
    return cache;
  }
}
