import { longitudeOf } from './motion.js';
import { chebyshevNodes, chebyshevValue, evaluateChebyshev, fitChebyshev } from '../math/index.js';
import type { Jet, Vector } from '../math/index.js';
import { ttDays } from '../time/index.js';
import type { TtDays } from '../time/index.js';
import { BlockCache } from './block-cache.js';
import type { Motion } from './paths.js';

export interface BlockShape {
  readonly blockDays: number;
  readonly nodes: number;
}

/** A coefficient smaller than this part of the largest is rounding noise: 0.0000001″. */
const NEGLIGIBLE = 5e-13;
/** Enough for a second derivative that changes. */
const FEWEST_TERMS = 5;

/** The Chebyshev coefficients of block `index`: those of x, then of y, then of z. */
export type Blocks = (index: number) => Float64Array;

/** About four centuries of the shortest blocks: 2 MB a track. */
export const KEPT_BLOCKS = 4096;

/**
 * A vector function of time, held as Chebyshev blocks that are filled only where someone looks. Block k covers
 * [k, k+1)·blockDays of TT since J2000.0, so that every track with blocks of one length shares its nodes.
 */
export class VectorTrack {
  private readonly jetX: Jet = emptyJet();
  private readonly jetY: Jet = emptyJet();
  private readonly jetZ: Jet = emptyJet();
  private readonly perDay: number;

  constructor(
    private readonly shape: BlockShape,
    private readonly blockAt: Blocks,
  ) {
    this.perDay = 2 / shape.blockDays;
  }

  position(tt: TtDays): Vector {
    const { blockDays } = this.shape;
    const index = Math.floor(tt / blockDays);
    const x = (tt - index * blockDays) * this.perDay - 1;
    const block = this.blockAt(index);
    const terms = block.length / 3;
    return {
      x: chebyshevValue(block, 0, terms, x),
      y: chebyshevValue(block, terms, terms, x),
      z: chebyshevValue(block, 2 * terms, terms, x),
    };
  }

  motion(tt: TtDays): Motion {
    const { blockDays } = this.shape;
    const { perDay } = this;
    const index = Math.floor(tt / blockDays);
    const x = (tt - index * blockDays) * perDay - 1;
    const block = this.blockAt(index);
    const terms = block.length / 3;
    const { jetX: jx, jetY: jy, jetZ: jz } = this;
    evaluateChebyshev(block, 0, terms, x, jx);
    evaluateChebyshev(block, terms, terms, x, jy);
    evaluateChebyshev(block, 2 * terms, terms, x, jz);
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
    const { blockDays } = this.shape;
    const index = Math.floor(tt / blockDays);
    const x = (tt - index * blockDays) * this.perDay - 1;
    const block = this.blockAt(index);
    const terms = block.length / 3;
    const { jetX: jx, jetY: jy } = this;
    evaluateChebyshev(block, 0, terms, x, jx);
    evaluateChebyshev(block, terms, terms, x, jy);
    return longitudeOf(jx, jy, this.perDay);
  }
}

/** A track whose blocks are fitted to the vectors at their nodes, and kept. */
export function fittedTrack(shape: BlockShape, sample: (block: number, node: number) => Vector): VectorTrack {
  const fit = new BlockFit(shape.nodes);
  const blocks = new BlockCache((block) => {
    for (let node = 0; node < shape.nodes; node++) fit.put(node, sample(block, node));
    return fit.coefficients();
  }, KEPT_BLOCKS);
  return new VectorTrack(shape, (index) => blocks.get(index));
}

/** The same of a function of time. */
export const trackOf = (shape: BlockShape, at: (tt: TtDays) => Vector): VectorTrack =>
  fittedTrack(shape, (block, node) => at(nodeTime(shape, block, node)));

/** Takes the vectors at the nodes of a block and gives its coefficients; one serves block after block. */
export class BlockFit {
  private readonly xs: Float64Array;
  private readonly ys: Float64Array;
  private readonly zs: Float64Array;
  private readonly fitted: Float64Array;

  constructor(private readonly nodes: number) {
    this.fitted = new Float64Array(3 * nodes);
    this.xs = new Float64Array(nodes);
    this.ys = new Float64Array(nodes);
    this.zs = new Float64Array(nodes);
  }

  put(node: number, { x, y, z }: Vector): void {
    this.xs[node] = x;
    this.ys[node] = y;
    this.zs[node] = z;
  }

  /** As many terms as matter: the farther and slower the body, the fewer. */
  coefficients(): Float64Array {
    const { nodes, fitted } = this;
    fitChebyshev(this.xs, fitted, 0);
    fitChebyshev(this.ys, fitted, nodes);
    fitChebyshev(this.zs, fitted, 2 * nodes);
    let largest = 0;
    for (const coefficient of fitted) largest = Math.max(largest, Math.abs(coefficient));
    const noise = NEGLIGIBLE * largest;
    let terms = nodes;
    while (
      terms > FEWEST_TERMS &&
      Math.abs(fitted[terms - 1]!) <= noise &&
      Math.abs(fitted[nodes + terms - 1]!) <= noise &&
      Math.abs(fitted[2 * nodes + terms - 1]!) <= noise
    ) {
      terms--;
    }
    const block = new Float64Array(3 * terms);
    for (let axis = 0; axis < 3; axis++) {
      block.set(fitted.subarray(axis * nodes, axis * nodes + terms), axis * terms);
    }
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
