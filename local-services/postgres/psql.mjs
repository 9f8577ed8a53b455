import { join } from "node:path";
import { runTool } from "../processes.mjs";

/** Runs SQL that names its values as psql variables (`:'name'`); answers with rows of texts. */
export async function psql({ bin, url }, sql, values = {}) {
  const { username, password, port, pathname } = new URL(url);
  const connection = `--dbname=host=127.0.0.1 port=${port} user=${username} dbname=${pathname.slice(1)}`;
  const output = await runTool(
    "psql",
    [join(bin, "psql"), connection, "-X", "-q", "-A", "-t", "-F", "\t", "-v", "ON_ERROR_STOP=1"],
    { input: `${settings(values)}${sql}`, env: { ...withoutSettings(process.env), PGPASSWORD: password } },
  );
  return output.trim() === ""
    ? []
    : output
        .trim()
        .split("\n")
        .map((line) => line.split("\t"));
}

/** Not as arguments: those can be read by every user of the machine. */
function settings(values) {
  const quote = (value) => `'${value.replaceAll("\\", "\\\\").replaceAll("'", "''")}'`;
  return Object.entries(values)
    .map(([name, value]) => `\\set ${name} ${quote(value)}\n`)
    .join("");
}

/** PGHOST, PGOPTIONS and their like would lead psql elsewhere. */
function withoutSettings(env) {
  return Object.fromEntries(Object.entries(env).filter(([name]) => !name.startsWith("PG")));
}
