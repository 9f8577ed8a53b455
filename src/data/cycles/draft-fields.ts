import type { z } from "zod";
import { driverKinds, sprayGrades } from "../../db/vocabulary";
import { choice, decimal, id, optionalDecimal, optionalText } from "../fields";

/**
 * The sheet on the bench page is a flat map from field to text, exactly as typed. These are the fields' names and what may
 * stand in each. An empty text and an absent field are the same.
 */
export type DraftFields = Record<string, string>;

export const mostColumns = 24;
export const mostRepeats = 20;
export const heldOpenColumn = "open";

export const conditionKeys = ["fluidTemperatureC", "pressureKpa", "driveVolts", "periodMs"] as const;
export const sharedCheckKeys = [
  "leadOhm",
  "windingTemperatureC",
  "leakagePressureKpa",
  "leakageSeconds",
] as const;
export const checkKeys = [
  "windingOhm",
  "windingTemperatureC",
  "leadOhm",
  "insulationMegohm",
  "leakageMm3PerMin",
  "leakagePressureKpa",
  "leakageSeconds",
  "sprayGrade",
  "note",
] as const;

export type ConditionKey = (typeof conditionKeys)[number];
export type SharedCheckKey = (typeof sharedCheckKeys)[number];
export type CheckKey = (typeof checkKeys)[number];
export type ColumnPart = "pulseWidthMs" | "pulseCount" | "openSeconds";

export const draftField = {
  condition: (key: ConditionKey | "driverKind") => `conditions.${key}`,
  sharedCheck: (key: SharedCheckKey) => `checks.${key}`,
  column: (columnId: string, part: ColumnPart) => `column.${columnId}.${part}`,
  channel: (setInjectorId: string) => `channel.${setInjectorId}`,
  load: (setInjectorId: string) => `load.${setInjectorId}`,
  reading: (setInjectorId: string, columnId: string, repeat: number) =>
    `reading.${setInjectorId}.${columnId}.${repeat}`,
  check: (setInjectorId: string, key: CheckKey) => `check.${setInjectorId}.${key}`,
  acknowledged: (findingKey: string) => `acknowledged.${findingKey}`,
};

/** The injector that a field belongs to, if it belongs to one. */
export function injectorOf(field: string): string | null {
  return /^(?:channel|load|reading|check)\.([0-9a-f-]{36})/.exec(field)?.[1] ?? null;
}

export function widthColumnId(number: number): string {
  return `w${number}`;
}

const conditionSchemas = {
  fluidTemperatureC: decimal({ label: "Fluid temperature", low: 0, high: 60, decimals: 2, unit: "°C" }),
  pressureKpa: decimal({
    label: "Pressure across the injector",
    low: 20,
    high: 2000,
    decimals: 2,
    unit: "kPa",
  }),
  driveVolts: decimal({ label: "Drive voltage", low: 1, high: 100, decimals: 2, unit: "V" }),
  periodMs: decimal({ label: "Period", low: 0.1, high: 10_000, decimals: 3, unit: "ms" }),
  driverKind: choice("Driver", driverKinds),
};

const columnSchemas = {
  pulseWidthMs: decimal({ label: "Pulse width", low: 0.05, high: 1000, decimals: 4, unit: "ms" }),
  pulseCount: decimal({ label: "Pulse count", low: 1, high: 1_000_000, decimals: 0 }),
  openSeconds: decimal({ label: "Time held open", low: 0.1, high: 3600, decimals: 3, unit: "s" }),
};

const checkSchemas = {
  windingOhm: optionalDecimal({ label: "Winding", low: 0.05, high: 1000, decimals: 3, unit: "Ω" }),
  windingTemperatureC: optionalDecimal({
    label: "Winding temperature",
    low: -10,
    high: 120,
    decimals: 2,
    unit: "°C",
  }),
  leadOhm: optionalDecimal({ label: "Lead resistance", low: 0, high: 20, decimals: 3, unit: "Ω" }),
  insulationMegohm: optionalDecimal({
    label: "Insulation",
    low: 0,
    high: 1_000_000,
    decimals: 2,
    unit: "MΩ",
  }),
  leakageMm3PerMin: optionalDecimal({
    label: "Leakage",
    low: 0,
    high: 100_000,
    decimals: 2,
    unit: "mm³/min",
  }),
  leakagePressureKpa: optionalDecimal({
    label: "Leakage pressure",
    low: 20,
    high: 2000,
    decimals: 2,
    unit: "kPa",
  }),
  leakageSeconds: optionalDecimal({ label: "Leakage time", low: 1, high: 3600, decimals: 1, unit: "s" }),
  sprayGrade: choice("Spray grade", sprayGrades),
  note: optionalText({ label: "Note", longest: 500, lines: "many" }),
};

const amountSchema = decimal({ label: "Amount", low: 0, high: 100_000, decimals: 4 });
const uuid = "[0-9a-f]{8}(?:-[0-9a-f]{4}){3}-[0-9a-f]{12}";
const column = "(?:w(?:[1-9]|1\\d|2[0-4])|open)";

const rules: [RegExp, z.ZodType][] = [
  [/^benchId$/, id("bench")],
  [/^fluidId$/, id("fluid")],
  [/^note$/, optionalText({ label: "Note", longest: 2000, lines: "many" })],
  [/^repeats$/, decimal({ label: "Runs", low: 1, high: mostRepeats, decimals: 0 })],
  ...Object.entries(conditionSchemas).map(rule("conditions\\.")),
  ...sharedCheckKeys.map((key) => rule("checks\\.")([key, checkSchemas[key]])),
  ...Object.entries(columnSchemas).map(rule(`column\\.${column}\\.`)),
  ...Object.entries(checkSchemas).map(rule(`check\\.${uuid}\\.`)),
  [new RegExp(`^channel\\.${uuid}$`), decimal({ label: "Channel", low: 1, high: 24, decimals: 0 })],
  [new RegExp(`^load\\.${uuid}$`), decimal({ label: "Load", low: 1, high: 48, decimals: 0 })],
  [new RegExp(`^reading\\.${uuid}\\.${column}\\.(?:[1-9]|1\\d|20)$`), amountSchema],
  [
    new RegExp(`^acknowledged\\.[a-z0-9-]{1,80}/(?:${uuid}|set)/(?:[\\d.]{1,12}|open|all)$`),
    optionalText({ label: "Recorded as read", longest: 2000 }),
  ],
];

function rule(prefix: string) {
  return ([key, schema]: [string, z.ZodType]): [RegExp, z.ZodType] => [
    new RegExp(`^${prefix}${key}$`),
    schema,
  ];
}

function schemaOf(field: string): z.ZodType | undefined {
  return rules.find(([pattern]) => pattern.test(field))?.[1];
}

export function isDraftField(field: string): boolean {
  return schemaOf(field) !== undefined;
}

/** What is wrong with a text in this field, or null. Nothing typed yet is not wrong. */
export function problemOf(field: string, text: string | undefined): string | null {
  if (text === undefined || text.trim() === "") return null;
  const parsed = schemaOf(field)?.safeParse(text);
  return parsed && !parsed.success ? (parsed.error.issues[0]?.message ?? null) : null;
}

/** The value of a text that is right; null for one that is wrong or not there. */
export function typedValue<Value>(fields: DraftFields, field: string): Value | null {
  const text = fields[field];
  if (text === undefined || text.trim() === "") return null;
  const parsed = schemaOf(field)?.safeParse(text);
  return parsed?.success ? (parsed.data as Value) : null;
}
