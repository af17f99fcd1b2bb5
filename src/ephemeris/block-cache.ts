/**
 * Blocks of a timeline, made on first need and kept until `capacity` newer ones have pushed them out, so that a
 * forecast of a thousand years needs no more memory than one of a century.
 */
export class BlockCache<Block> {
  private readonly blocks = new Map<number, Block>();
  /** Most readers come back to the block they have just read. */
  private lastIndex = NaN;
  private lastBlock: Block | undefined;

  constructor(
    private readonly make: (index: number) => Block,
    private readonly capacity: number,
  ) {}

  get(index: number): Block {
    if (this.lastIndex === index && this.lastBlock !== undefined) return this.lastBlock;
    const block = this.blocks.get(index) ?? this.add(index);
    this.lastIndex = index;
    this.lastBlock = block;
    return block;
  }

  private add(index: number): Block {
    if (this.blocks.size >= this.capacity) {
      const oldest = this.blocks.keys().next();
      if (oldest.done !== true) this.blocks.delete(oldest.value);
    }
    const block = this.make(index);
    this.blocks.set(index, block);
    return block;
  }
}
