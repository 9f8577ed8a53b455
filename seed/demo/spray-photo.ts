import sharp from "sharp";
import { uniformGenerator } from "../../src/metrology/uncertainty/uniform-generator";
import type { InjectorTruth } from "../factories/synthetic-bench";

const [width, height] = [720, 960];
const spread = { good: 0.16, acceptable: 0.24, poor: 0.34 };

/** A drawn picture of a spray: droplets below a nozzle, wider and ragged where the injector is dirty. */
export function drawSpray(seed: number, grade: InjectorTruth["sprayGrade"]): Promise<Buffer> {
  const random = uniformGenerator(seed);
  const lean = grade === "poor" ? 0.08 * (random() - 0.3) : 0;
  const drops = Array.from({ length: 520 }, () => {
    const down = random() ** 0.7;
    const aside = (random() + random() - 1) * spread[grade] * down + lean * down;
    const x = width * (0.5 + aside);
    const y = 190 + down * (height - 230);
    const radius = 1.1 + 2.6 * random() * (grade === "poor" ? 1.7 : 1);
    return `<circle cx="${x.toFixed(1)}" cy="${y.toFixed(1)}" r="${radius.toFixed(1)}" opacity="${(0.25 + 0.6 * random()).toFixed(2)}"/>`;
  });
  const picture = `
    <svg xmlns="http://www.w3.org/2000/svg" width="${width}" height="${height}">
      <rect width="100%" height="100%" fill="#1a242c"/>
      <rect x="${width / 2 - 46}" y="0" width="92" height="120" fill="#6b7a86"/>
      <rect x="${width / 2 - 26}" y="120" width="52" height="62" fill="#93a2ad"/>
      <g fill="#dfe9ef">${drops.join("")}</g>
    </svg>`;
  return sharp(Buffer.from(picture)).jpeg({ quality: 80 }).toBuffer();
}
