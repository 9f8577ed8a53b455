import "server-only";
import { inflateSync } from "node:zlib";

const woff = { signature: 0x774f4646, header: 44, entry: 20 };
const sfnt = { header: 12, entry: 16 };

type Table = { tag: number; checksum: number; bytes: Buffer };

/**
 * A WOFF file as the plain font that it packs (W3C WOFF 1.0). The PDF library unpacks a table of a WOFF font anew for
 * every glyph it takes from it, which made up more than half of the time of a certificate.
 */
export function unpackWoff(file: Buffer): Buffer {
  if (file.readUInt32BE(0) !== woff.signature) throw new Error("The font file is not WOFF");
  const flavor = file.readUInt32BE(4);
  const tables = Array.from({ length: file.readUInt16BE(12) }, (_, index) => readTable(file, index));
  return assemble(flavor, tables);
}

function readTable(file: Buffer, index: number): Table {
  const at = woff.header + index * woff.entry;
  const [tag, offset, packed, length, checksum] = Array.from({ length: 5 }, (_, word) =>
    file.readUInt32BE(at + word * 4),
  ) as [number, number, number, number, number];
  const bytes = file.subarray(offset, offset + packed);
  return { tag, checksum, bytes: packed < length ? inflateSync(bytes) : bytes };
}

function assemble(flavor: number, tables: Table[]): Buffer {
  const head = Buffer.alloc(sfnt.header + tables.length * sfnt.entry);
  const power = Math.floor(Math.log2(tables.length));
  head.writeUInt32BE(flavor, 0);
  head.writeUInt16BE(tables.length, 4);
  head.writeUInt16BE(2 ** power * 16, 6);
  head.writeUInt16BE(power, 8);
  head.writeUInt16BE((tables.length - 2 ** power) * 16, 10);
  const parts: Buffer[] = [head];
  let offset = head.length;
  for (const [index, { tag, checksum, bytes }] of tables.entries()) {
    const at = sfnt.header + index * sfnt.entry;
    for (const [word, value] of [tag, checksum, offset, bytes.length].entries())
      head.writeUInt32BE(value, at + word * 4);
    const padding = Buffer.alloc((4 - (bytes.length % 4)) % 4);
    parts.push(bytes, padding);
    offset += bytes.length + padding.length;
  }
  return Buffer.concat(parts);
}
