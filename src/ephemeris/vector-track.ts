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
  private readonly jets: [Jet, Jet, Jet] = [emptyJet(), emptyJet(), emptyJet()];

  constructor(
    private readonly shape: BlockShape,
    /** The vectors at the nodes of block `index`, in the order of `nodeTimes`. */
    sample: (nodes: readonly TtDays[], index: number) => readonly Vector[],
  ) {
    this.blocks = new BlockCache(
      (index) => fitVectors(sample(nodeTimes(shape, index), index), shape.nodes),
      KEPT_BLOCKS,
    );
  }

  position(tt: TtDays): Vector {
    const { blockDays, nodes } = this.shape;
    const index = Math.floor(tt / blockDays);
    const x = (2 * (tt - index * blockDays)) / blockDays - 1;
    const block = this.blocks.get(index);
    return {
      x: chebyshevValue(block, 0, nodes, x),
      y: chebyshevValue(block, nodes, nodes, x),
      z: chebyshevValue(block, 2 * nodes, nodes, x),
    };
  }

  motion(tt: TtDays): Motion {
    const { blockDays, nodes } = this.shape;
    const index = Math.floor(tt / blockDays);
    const x = (2 * (tt - index * blockDays)) / blockDays - 1;
    const block = this.blocks.get(index);
    const [jx, jy, jz] = this.jets;
    evaluateChebyshev(block, 0, nodes, x, jx);
    evaluateChebyshev(block, nodes, nodes, x, jy);
    evaluateChebyshev(block, 2 * nodes, nodes, x, jz);
    const perDay = 2 / blockDays;
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
}

/** The instants at which block `index` is sampled. */
export function nodeTimes({ blockDays, nodes }: BlockShape, index: number): TtDays[] {
  return Array.from(chebyshevNodes(nodes), (x) => ttDays((index + (x + 1) / 2) * blockDays));
}

function fitVectors(vectors: readonly Vector[], nodes: number): Float64Array {
  const block = new Float64Array(3 * nodes);
  fitChebyshev(
    Float64Array.from(vectors, (v) => v.x),
    block,
    0,
  );
  fitChebyshev(
    Float64Array.from(vectors, (v) => v.y),
    block,
    nodes,
  );
  fitChebyshev(
    Float64Array.from(vectors, (v) => v.z),
    block,
    2 * nodes,
  );
  return block;
}

function emptyJet(): Jet {
  return { value: 0, rate: 0, acceleration: 0 };
}
