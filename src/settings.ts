import "server-only";
import { z } from "zod";

/** The only reader of process.env. A setting that is missing or weak stops the start and is named. */
const schema = z.object({
  DATABASE_URL: z.url({ protocol: /^postgres(ql)?$/, message: "must be a postgres:// address" }),
  APP_ORIGIN: z
    .url({ protocol: /^https?$/, message: "must be the http(s) address people open" })
    .transform((address) => new URL(address).origin),
  DATABASE_POOL: z.coerce.number().int().min(2).max(50).default(10),
});

function readSettings() {
  const parsed = schema.safeParse(process.env);
  if (parsed.success) return parsed.data;
  const problems = parsed.error.issues.map((issue) => `${issue.path.join(".")} ${issue.message}`);
  throw new Error(`Settings are not usable: ${problems.join("; ")}`);
}

let cached: z.infer<typeof schema> | undefined;

/** Read late, so that a build needs no settings and a served process fails at its first use. */
export function settings() {
  cached ??= readSettings();
  return cached;
}
