import { checkNode } from "./node-version.mjs";
import { onlyOne } from "./only-one.mjs";
import { ensurePackages } from "./packages.mjs";
import { makeLocalFolder } from "./project.mjs";
import { atEnd, runSession } from "./session.mjs";
import { duration, say, step } from "./terminal.mjs";
import { select } from "./test/selection.mjs";
import { ensureTools } from "./test/tools.mjs";

const sum = { passed: 0, failed: 0 };
let finished = false;

await runSession(async () => {
  // Registered first, so said last: nothing follows the sum.
  atEnd(() => {
    if (finished) say(`${sum.passed} passed, ${sum.failed} failed`);
  });
  const chosen = select(process.argv.slice(2));
  await prepare(chosen);
  for (const part of chosen) await runPart(part);
  finished = true;
  return sum.failed > 0 ? 1 : 0;
});

async function prepare(chosen) {
  say("Evenrail, tests");
  checkNode();
  makeLocalFolder();
  if (chosen.some(({ alone }) => alone)) await onlyOne("test", {}, () => alreadyRunning);
  await step("packages", () => ensurePackages());
  await step("programs", () => ensureTools(chosen.flatMap(({ tools = [] }) => tools)));
}

const alreadyRunning =
  "npm test is already running for this project: wait for it, or choose parts that need no build.";

async function runPart({ name, run, args }) {
  say(`\n== ${name} ==`);
  const startedAt = performance.now();
  const { passed, failed } = await run(args);
  sum.passed += passed;
  sum.failed += failed;
  const elapsed = duration(performance.now() - startedAt);
  say(`== ${name}: ${passed} passed, ${failed} failed, ${elapsed} ==\n`);
}
