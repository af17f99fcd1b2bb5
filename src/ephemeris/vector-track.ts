import { longitudeOf } from './motion.js';
import { chebyshevNodes, chebyshevValue, evaluateChebyshev, fitChebyshev } from '../math/index.js';
import type { Jet, Vector } from '../math/index.js';
import { ttDays } from '../time/index.js';
import type { TtDays } from '../time/index.js';
import { BlockCache } from './block-cache.js';
import type { Motion } from './paths.js';

/** About four centuries of the shortest blocks: 2 MB a track. */
const KEPT_BLOCKS = 4096;

export interface BlockShape {
  readonly blockDays: number;
  readonly nodes: number;
}

/**
 * A vector function of time, held as Chebyshev blocks that are filled only where someone looks. Block k covers
 * [k, k+1)·blockDays of TT since J2000.0, so that every track with blocks of one length shares its nodes.
 */
export class VectorTrack {
  private readonly blocks: BlockCache<Float64Array>;
  private readonly jets: readonly [Jet, Jet, Jet] = [emptyJet(), emptyJet(), emptyJet()];
  private readonly samples: readonly [Float64Array, Float64Array, Float64Array];
  private readonly perDay: number;

  constructor(
    private readonly shape: BlockShape,
    /** The vector at node `node` of block `block`, the instant of which is `tt`. */
    private readonly sample: (tt: TtDays, node: number, block: number) => Vector,
  ) {
    this.blocks = new BlockCache((index) => this.fill(index), KEPT_BLOCKS);
    this.samples = [
      new Float64Array(shape.nodes),
      new Float64Array(shape.nodes),
      new Float64Array(shape.nodes),
    ];
    this.perDay = 2 / shape.blockDays;
  }

  position(tt: TtDays): Vector {
    const { blockDays, nodes } = this.shape;
    const index = Math.floor(tt / blockDays);
    const x = (tt - index * blockDays) * this.perDay - 1;
    const block = this.blocks.get(index);
    return {
      x: chebyshevValue(block, 0, nodes, x),
      y: chebyshevValue(block, nodes, nodes, x),
      z: chebyshevValue(block, 2 * nodes, nodes, x),
    };
  }

  motion(tt: TtDays): Motion {
    const { blockDays, nodes } = this.shape;
    const { perDay } = this;
    const index = Math.floor(tt / blockDays);
    const x = (tt - index * blockDays) * perDay - 1;
    const block = this.blocks.get(index);
    const [jx, jy, jz] = this.jets;
    evaluateChebyshev(block, 0, nodes, x, jx);
    evaluateChebyshev(block, nodes, nodes, x, jy);
    evaluateChebyshev(block, 2 * nodes, nodes, x, jz);
    const perDay2 = perDay * perDay;
    return {
      position: { x: jx.value, y: jy.value, z: jz.value },
      velocity: { x: jx.rate * perDay, y: jy.rate * perDay, z: jz.rate * perDay },
      acceleration: {
        x: jx.acceleration * perDay2,
        y: jy.acceleration * perDay2,
        z: jz.acceleration * perDay2,
      },
    };
  }

  /** The vector's longitude about the z axis, radians in (−π, π], with its derivatives. */
  longitude(tt: TtDays): Jet {
    const { blockDays, nodes } = this.shape;
    const index = Math.floor(tt / blockDays);
    const x = (tt - index * blockDays) * this.perDay - 1;
    const block = this.blocks.get(index);
    const [jx, jy] = this.jets;
    evaluateChebyshev(block, 0, nodes, x, jx);
    evaluateChebyshev(block, nodes, nodes, x, jy);
    return longitudeOf(jx, jy, this.perDay);
  }

  private fill(index: number): Float64Array {
    const { nodes } = this.shape;
    const [xs, ys, zs] = this.samples;
    for (let k = 0; k < nodes; k++) {
      const { x, y, z } = this.sample(nodeTime(this.shape, index, k), k, index);
      xs[k] = x;
      ys[k] = y;
      zs[k] = z;
    }
    const block = new Float64Array(3 * nodes);
    fitChebyshev(xs, block, 0);
    fitChebyshev(ys, block, nodes);
    fitChebyshev(zs, block, 2 * nodes);
    return block;
  }
}

/** The instant of one node of one block. */
export function nodeTime({ blockDays, nodes }: BlockShape, block: number, node: number): TtDays {
  return ttDays((block + (chebyshevNodes(nodes)[node]! + 1) / 2) * blockDays);
}

function emptyJet(): Jet {
  return { value: 0, rate: 0, acceleration: 0 };
}
