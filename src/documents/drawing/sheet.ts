import "server-only";
import { type Block, nothing, stack } from "./block";
import { addPage, type PageSize } from "./open-document";
import type { Pen } from "./pen";

export type Frame = {
  page: PageSize;
  left: number;
  width: number;
  /** Where the first block of a page may start; pages count from 0. */
  topOf(pageIndex: number): number;
  bottom: number;
};

/** Rows that may run on over pages below a lead that is drawn first, and its shorter form on every further page. */
export type Section = { lead: Block; repeated?: Block; rows: readonly Block[] };

export type Sheet = {
  width: number;
  /** Puts a section below the last one; a new page begins where it would not fit. */
  place(section: Section, before?: number): void;
};

export function openSheet({ doc }: Pen, frame: Frame): Sheet {
  let page = -1;
  let y = 0;

  function turn(): void {
    addPage(doc, frame.page);
    page += 1;
    y = frame.topOf(page);
  }

  function put(block: Block): void {
    block.draw(frame.left, y);
    y += block.height;
  }

  const fits = (height: number) => y + height <= frame.bottom;
  turn();

  return {
    width: frame.width,
    place({ lead, repeated = nothing, rows }, before = 0) {
      if (y > frame.topOf(page)) y += before;
      const start = stack([lead, ...rows.slice(0, 2)]);
      if (!fits(start.height) && y > frame.topOf(page)) turn();
      put(lead);
      for (const row of rows) {
        if (!fits(row.height)) {
          turn();
          put(repeated);
        }
        put(row);
      }
    },
  };
}
