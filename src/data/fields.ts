import { z } from "zod";
import { parseDecimal } from "../format/parse-decimal";

/**
 * The fields that inputs are built of. Shared by the forms and the data layer, so it runs in the browser too.
 * Every message names the field and its limit.
 */

// Controls other than tab, newline and return, and halves of a surrogate pair.
const unstorable = /(?![\t\n\r])\p{Cc}|\p{Cs}/u;
// Direction overrides, zero-width signs and their like: they change what a name looks like without being seen.
const disguising = /\p{Cf}/u;

type TextOptions = { label: string; longest: number; required?: boolean; lines?: "one" | "many" };

/** Text in Unicode's composed form, trimmed. */
export function text({ label, longest, required = true, lines = "one" }: TextOptions) {
  return z
    .string({ error: `${label} is missing.` })
    .transform((typed) => typed.normalize("NFC").trim())
    .pipe(
      z
        .string()
        .min(required ? 1 : 0, `${label} is missing.`)
        .refine((value) => [...value].length <= longest, `${label} has at most ${longest} characters.`)
        .refine(
          (value) => !unstorable.test(value),
          `${label} holds a control character that cannot be stored.`,
        )
        .refine(
          (value) => !disguising.test(value),
          `${label} holds an invisible character; please type it anew.`,
        )
        .refine((value) => lines === "many" || !/[\t\n\r]/.test(value), `${label} is one line.`),
    );
}

export function optionalText(options: Omit<TextOptions, "required">) {
  return z.preprocess((value) => value ?? "", text({ ...options, required: false }));
}

export function reason(label = "Reason") {
  return text({ label, longest: 500, lines: "many" });
}

export function email(label = "E-mail") {
  return text({ label, longest: 254 }).pipe(z.email(`${label} looks like name@workshop.example.`));
}

type DecimalOptions = { label: string; low: number; high: number; decimals: number; unit?: string };

/** A measured value as a person types it; see parseDecimal for the grammar. */
export function decimal(options: DecimalOptions) {
  return z.unknown().transform((typed, context): number => {
    const value = readDecimal(typed, options, context);
    if (value !== null) return value;
    context.addIssue({ code: "custom", message: `${options.label} is missing.` });
    return z.NEVER;
  });
}

/** Null when nothing was typed. */
export function optionalDecimal(options: DecimalOptions) {
  return z.unknown().transform((typed, context): number | null => readDecimal(typed, options, context));
}

function readDecimal(typed: unknown, options: DecimalOptions, context: z.RefinementCtx): number | null {
  if (typed === undefined || typed === null || String(typed).trim() === "") return null;
  const parsed = parseDecimal(String(typed));
  const wrong = parsed.ok ? limitBroken(parsed, options) : `${options.label}: ${parsed.problem}`;
  if (parsed.ok && !wrong) return parsed.value;
  context.addIssue({ code: "custom", message: wrong ?? "" });
  return z.NEVER;
}

export function wholeNumber(options: Omit<DecimalOptions, "decimals">) {
  return decimal({ ...options, decimals: 0 });
}

function limitBroken(parsed: { value: number; decimals: number }, options: DecimalOptions): string | null {
  const unit = options.unit ? ` ${options.unit}` : "";
  if (parsed.decimals > options.decimals)
    return options.decimals === 0
      ? `${options.label} is a whole number.`
      : `${options.label} has at most ${options.decimals} decimals.`;
  if (parsed.value < options.low || parsed.value > options.high)
    return `${options.label} lies between ${options.low} and ${options.high}${unit}.`;
  return null;
}

export function choice<const Words extends readonly [string, ...string[]]>(label: string, words: Words) {
  return z.enum(words, { error: `${label}: please choose one.` });
}

/** Any number of a closed list; a form sends none, one or several. */
export function choices<const Words extends readonly [string, ...string[]]>(
  label: string,
  words: Words,
  least = 0,
) {
  return z.preprocess(
    (value) => (value === undefined || value === "" ? [] : Array.isArray(value) ? value : [value]),
    z
      .array(z.enum(words, { error: `${label}: please choose from the list.` }))
      .min(least, `${label}: please choose at least ${least === 1 ? "one" : least}.`)
      .transform((chosen) => words.filter((word) => chosen.includes(word)) as Words[number][]),
  );
}

/** A tick box: a form sends "on" or nothing, JSON sends a boolean. */
export function tick() {
  return z.preprocess((value) => value === true || value === "on" || value === "true", z.boolean());
}

export function day(label: string) {
  return z.iso.date({ error: `${label} is a day such as 2026-03-14.` });
}

export function id(noun: string) {
  return z.uuid({ error: `Please choose a ${noun}.` });
}

export const baseVersion = z.coerce.number().int().min(1);

/** Made once per form by the client: the same key again is the same write, not a second one. */
export const idempotencyKey = z.uuid({ error: "The form has no key. Reload the page." });

/** Every write's input carries its key. */
export function writeInput<Shape extends z.ZodRawShape>(shape: Shape) {
  return z.object({ idempotencyKey, ...shape });
}

/** What is looked for: what could not be stored anywhere is left out, and nothing is refused. */
export function searched(longest = 160) {
  return z
    .string()
    .max(longest)
    .catch("")
    .transform((typed) => typed.normalize("NFC").replace(new RegExp(unstorable, "gu"), "").trim());
}

export const noInput = z.undefined().or(z.null()).or(z.object({}));

/** Paging of a list: clamped, never refused. */
export const page = z.object({
  startRow: z.coerce.number().int().min(0).max(1_000_000).catch(0),
  endRow: z.coerce.number().int().min(1).max(1_000_100).catch(50),
});
