import type { Rotation, Vector } from '../math/index.js';
import type { TtDays } from '../time/index.js';
import type { ApparentPlaces, Observer } from './apparent.js';
import { BlockCache } from './block-cache.js';
import { eclipticFromEquator, rotationTo } from './frames.js';
import type { Frame } from './paths.js';
import { nodeTime } from './vector-track.js';
import type { BlockShape } from './vector-track.js';

const KEPT_BLOCKS = 2048;

/** How the numbers of one node lie in a block: three vectors of the observer, then three rows for each frame. */
const NUMBERS_PER_NODE = 27;
const EARTH_FROM_SUN = 0;
const SUN_VELOCITY = 3;
const VELOCITY = 6;
const ROWS: Readonly<Record<Frame, number>> = { 'equator-of-date': 9, 'ecliptic-of-date': 18 };

/**
 * What all bodies share at the nodes of a block: where the Earth is, and how the axes of date are turned. Kept as bare
 * numbers, because tens of thousands of small objects would cost the garbage collector more than the astronomy.
 */
export class NodeSkies {
  private readonly blocks: BlockCache<Float64Array>;

  constructor(
    private readonly shape: BlockShape,
    private readonly places: ApparentPlaces,
  ) {
    this.blocks = new BlockCache((index) => this.fill(index), KEPT_BLOCKS);
  }

  observer(block: number, node: number): Observer {
    const numbers = this.blocks.get(block);
    const at = node * NUMBERS_PER_NODE;
    return {
      tt: this.timeOf(block, node),
      earthFromSun: read(numbers, at + EARTH_FROM_SUN),
      sunVelocity: read(numbers, at + SUN_VELOCITY),
      velocity: read(numbers, at + VELOCITY),
    };
  }

  turn(frame: Frame, block: number, node: number): Rotation {
    const numbers = this.blocks.get(block);
    const at = node * NUMBERS_PER_NODE + ROWS[frame];
    return [read(numbers, at), read(numbers, at + 3), read(numbers, at + 6)];
  }

  private timeOf(block: number, node: number): TtDays {
    return nodeTime(this.shape, block, node);
  }

  private fill(block: number): Float64Array {
    const numbers = new Float64Array(this.shape.nodes * NUMBERS_PER_NODE);
    for (let node = 0; node < this.shape.nodes; node++) {
      const at = node * NUMBERS_PER_NODE;
      const tt = this.timeOf(block, node);
      const { earthFromSun, sunVelocity, velocity } = this.places.observer(tt);
      const equator = rotationTo('equator-of-date', tt);
      write(numbers, at + EARTH_FROM_SUN, earthFromSun);
      write(numbers, at + SUN_VELOCITY, sunVelocity);
      write(numbers, at + VELOCITY, velocity);
      writeRows(numbers, at + ROWS['equator-of-date'], equator);
      writeRows(numbers, at + ROWS['ecliptic-of-date'], eclipticFromEquator(equator, tt));
    }
    return numbers;
  }
}

const read = (numbers: Float64Array, at: number): Vector => ({
  x: numbers[at]!,
  y: numbers[at + 1]!,
  z: numbers[at + 2]!,
});

function write(numbers: Float64Array, at: number, { x, y, z }: Vector): void {
  numbers[at] = x;
  numbers[at + 1] = y;
  numbers[at + 2] = z;
}

function writeRows(numbers: Float64Array, at: number, rows: Rotation): void {
  rows.forEach((row, i) => {
    write(numbers, at + 3 * i, row);
  });
}
