import { ensureBuild, testedBuild } from "../build.mjs";
import { ownerEnvironment } from "../scripts.mjs";
import { playBrowser } from "./browser.mjs";
import { testCluster } from "./database.mjs";
import { reportPath, sumUp, vitestCounts } from "./reports.mjs";
import { endsBadly, failsShown } from "./run-shown.mjs";

const typesConfiguration = "tests/tsconfig.json";

/** In the order they run: what is quick to fail comes first. `tools` and `alone` are what a part needs beforehand. */
export const parts = {
  check: { run: check },
  unit: { tools: ["pdf"], takesArguments: true, run: (args) => vitest("unit", args, process.env) },
  data: { tools: ["pdf"], takesArguments: true, run: data },
  build: { alone: true, run: build },
  browser: { tools: ["pdf", "browser"], alone: true, takesArguments: true, run: playBrowser },
};

/** Formatting and lint, who may import whom, types. */
async function check() {
  const env = { ...process.env, EVENRAIL_BUILD_FOLDER: testedBuild, NEXT_TELEMETRY_DISABLED: "1" };
  const failures = [
    await endsBadly("biome", ["check", "--error-on-warnings"], env),
    await endsBadly("depcruise", ["src", "seed", "tests"], env),
    (await endsBadly("next", ["typegen"], env)) || (await endsBadly("tsc", ["-p", typesConfiguration], env)),
  ];
  const failed = failures.filter(Boolean).length;
  return { passed: failures.length - failed, failed };
}

async function vitest(project, args, env) {
  const report = reportPath(project);
  const reporters = ["--reporter=default", "--reporter=json", `--outputFile.json=${report}`];
  const exitedBadly = await endsBadly("vitest", ["run", `--project=${project}`, ...reporters, ...args], env);
  return sumUp(vitestCounts(report), { exitedBadly, chosen: args.length > 0 });
}

async function data(args) {
  const cluster = await testCluster();
  return vitest("data", args, ownerEnvironment(cluster, "postgres"));
}

async function build() {
  const failed = await failsShown(() => ensureBuild(testedBuild, (text) => process.stdout.write(text)));
  return failed ? { passed: 0, failed: 1 } : { passed: 1, failed: 0 };
}
