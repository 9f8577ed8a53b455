import type { Stage } from "../../src/db/vocabulary";
import { uniformGenerator } from "../../src/metrology/uncertainty/uniform-generator";
import type { World } from "./world";

export type SetPlan = {
  /** Counts the sets: what is random about one follows from it. */
  serial: number;
  customerId: string;
  model: World["models"][string];
  toleranceClassId: string;
  serials: (string | null)[];
  checkedInDaysAgo: number;
  promisedAfterDays: number;
  /** How far the set has come. */
  reached: Stage;
  /** Days between one step and the next. */
  pace: number;
  hold?: string;
  returned?: string;
  rejects?: { position: number; reason: string };
  photographed?: boolean;
};

const pastSets = 43;
const longestAgo = 420;
const shortestAgo = 9;

/** About sixty sets: a past that is settled, and a present in which some things wait and some are late. */
export function planSets(world: World): SetPlan[] {
  const random = uniformGenerator(20_261);
  const pick = <Item>(items: readonly Item[]) => items[Math.floor(random() * items.length)]!;
  const counts = [4, 4, 6, 8, 8, 4, 6];
  const models = Object.values(world.models);
  const classes = Object.values(world.classes);
  const some = (serial: number) => ({
    serial,
    customerId: pick(world.customers.slice(1)),
    model: pick(models),
    toleranceClassId: pick(classes),
    serials: serialsOf(serial, pick(counts)),
    promisedAfterDays: 6 + Math.floor(random() * 5),
    pace: 1,
  });
  const past = Array.from({ length: pastSets }, (_, index): SetPlan => {
    const checkedInDaysAgo = Math.round(longestAgo - (index * (longestAgo - shortestAgo)) / (pastSets - 1));
    return { ...some(index + 1), checkedInDaysAgo, reached: "handed over" };
  });
  past[8]!.returned = "Two bodies are cracked at the connector; the customer wants them back as they are.";
  past[20]!.rejects = { position: 3, reason: "Winding is open when warm." };
  const present = presentDay.map(
    (now, index): SetPlan => ({ ...some(pastSets + index + 1), promisedAfterDays: 7, ...now }),
  );
  return [...past, ...present, ...visitsOf(world)];
}

type Present = Pick<SetPlan, "checkedInDaysAgo" | "reached"> & Partial<SetPlan>;

const presentDay: Present[] = [
  { checkedInDaysAgo: 8, reached: "certified", photographed: true },
  { checkedInDaysAgo: 6, reached: "certified" },
  { checkedInDaysAgo: 13, reached: "in review", pace: 3 },
  { checkedInDaysAgo: 5, reached: "in review", photographed: true },
  {
    checkedInDaysAgo: 4,
    reached: "in review",
    rejects: { position: 2, reason: "Leaks in a stream after cleaning." },
  },
  { checkedInDaysAgo: 4, reached: "as left", promisedAfterDays: 6 },
  { checkedInDaysAgo: 12, reached: "cleaning", pace: 4 },
  { checkedInDaysAgo: 3, reached: "cleaning" },
  { checkedInDaysAgo: 2, reached: "as found" },
  { checkedInDaysAgo: 11, reached: "as found", promisedAfterDays: 9, pace: 5 },
  {
    checkedInDaysAgo: 9,
    reached: "as found",
    hold: "Customer is asked whether the corroded injector is worth cleaning.",
  },
  { checkedInDaysAgo: 1, reached: "checked in" },
  { checkedInDaysAgo: 1, reached: "checked in" },
  { checkedInDaysAgo: 10, reached: "checked in", promisedAfterDays: 8 },
];

/** One customer brings the same eight injectors three times. */
function visitsOf(world: World): SetPlan[] {
  const visit = {
    customerId: world.customers[0]!,
    model: world.models["KX-440"]!,
    toleranceClassId: world.classes["Road race"]!,
    serials: serialsOf(901, 8),
    promisedAfterDays: 7,
    pace: 1,
  };
  return [
    { ...visit, serial: 901, checkedInDaysAgo: 395, reached: "handed over" },
    { ...visit, serial: 902, checkedInDaysAgo: 198, reached: "handed over", photographed: true },
    { ...visit, serial: 903, checkedInDaysAgo: 7, reached: "certified", photographed: true },
  ];
}

/** Every fifth set came without serials. */
function serialsOf(serial: number, count: number): (string | null)[] {
  const begin = 31_000 + serial * 37;
  return Array.from({ length: count }, (_, index) => (serial % 5 === 0 ? null : `${begin + index * 3}`));
}
