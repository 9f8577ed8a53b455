import sharp from "sharp";
import { uniformGenerator } from "../../src/metrology/uncertainty/uniform-generator";
import type { InjectorTruth } from "../factories/synthetic-bench";

const [width, height] = [480, 640];
const spread = { good: 0.16, acceptable: 0.24, poor: 0.34 };
const background = [26, 36, 44] as const;
const steel = [118, 132, 143] as const;
const droplet = [223, 233, 239] as const;

type Colour = readonly [number, number, number];

/** A drawn picture of a spray: droplets below a nozzle, wider and ragged where the injector is dirty. */
export function drawSpray(seed: number, grade: InjectorTruth["sprayGrade"]): Promise<Buffer> {
  const random = uniformGenerator(seed);
  const pixels = new Uint8Array(width * height * 3);
  fill(pixels, { left: 0, top: 0, right: width, bottom: height }, background, 1);
  fill(pixels, { left: width / 2 - 31, top: 0, right: width / 2 + 31, bottom: 80 }, steel, 0.8);
  fill(pixels, { left: width / 2 - 17, top: 80, right: width / 2 + 17, bottom: 121 }, steel, 1);
  const lean = grade === "poor" ? 0.08 * (random() - 0.3) : 0;
  for (let drop = 0; drop < 620; drop++) {
    const down = random() ** 0.7;
    const aside = (random() + random() - 1) * spread[grade] * down + lean * down;
    const size = 1 + 2 * random() * (grade === "poor" ? 1.7 : 1);
    const [x, y] = [width * (0.5 + aside), 124 + down * (height - 150)];
    fill(
      pixels,
      { left: x, top: y, right: x + size, bottom: y + size * 1.6 },
      droplet,
      0.25 + 0.6 * random(),
    );
  }
  return sharp(pixels, { raw: { width, height, channels: 3 } })
    .blur(0.7)
    .jpeg({ quality: 80 })
    .toBuffer();
}

type Box = { left: number; top: number; right: number; bottom: number };

function fill(pixels: Uint8Array, { left, top, right, bottom }: Box, colour: Colour, cover: number): void {
  for (let y = Math.floor(top); y < Math.min(height, bottom); y++)
    for (let x = Math.max(0, Math.floor(left)); x < Math.min(width, right); x++)
      for (const [channel, value] of colour.entries()) {
        const at = (y * width + x) * 3 + channel;
        pixels[at] = Math.round(pixels[at]! * (1 - cover) + value * cover);
      }
}
