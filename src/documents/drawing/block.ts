import "server-only";

/** Something that knows its height before it is drawn, so that pages break where they should. */
export type Block = { height: number; draw(x: number, y: number): void };

export const nothing: Block = { height: 0, draw: () => undefined };

export function gap(height: number): Block {
  return { height, draw: () => undefined };
}

/** One below the other. */
export function stack(blocks: readonly Block[], between = 0): Block {
  const height = blocks.reduce((sum, block) => sum + block.height, 0);
  return {
    height: height + between * Math.max(0, blocks.length - 1),
    draw(x, y) {
      let top = y;
      for (const block of blocks) {
        block.draw(x, top);
        top += block.height + between;
      }
    },
  };
}

/** Side by side, each at its own distance from the left. */
export function beside(parts: readonly { at: number; block: Block }[]): Block {
  return {
    height: Math.max(0, ...parts.map(({ block }) => block.height)),
    draw(x, y) {
      for (const { at, block } of parts) block.draw(x + at, y);
    },
  };
}

export function inset(block: Block, { left = 0, top = 0, bottom = 0 }): Block {
  return {
    height: block.height + top + bottom,
    draw: (x, y) => block.draw(x + left, y + top),
  };
}
