import { createWriteStream } from "node:fs";
import { serve } from "../application.mjs";
import { ensureBuild, testedBuild } from "../build.mjs";
import { freePort } from "../ports.mjs";
import { localFile } from "../project.mjs";
import { appEnvironment, ownerEnvironment, seedDemo } from "../scripts.mjs";
import { step } from "../terminal.mjs";
import { makeTestDatabase } from "./database.mjs";
import { playwrightCounts, reportPath, sumUp } from "./reports.mjs";
import { endsBadly, failsShown } from "./run-shown.mjs";

/** Playwright against the built application, on a port and a database of its own with the demo in it. */
export async function playBrowser(args) {
  const port = await freePort();
  const served = {};
  if (await failsShown(async () => Object.assign(served, await serveDemo(port))))
    return { passed: 0, failed: 1 };
  const report = reportPath("browser");
  const env = {
    ...ownerEnvironment(served.cluster, served.database, port),
    PLAYWRIGHT_JSON_OUTPUT_FILE: report,
    // Factories of the seed are server code.
    NODE_OPTIONS: `${process.env.NODE_OPTIONS ?? ""} --conditions=react-server`.trim(),
  };
  const exitedBadly = await endsBadly("playwright", ["test", "--reporter=list,json", ...args], env);
  await served.application.stop();
  return sumUp(playwrightCounts(report), { exitedBadly, chosen: args.length > 0 });
}

async function serveDemo(port) {
  await step("build", () => ensureBuild(testedBuild));
  const { cluster, database } = await step(
    "database",
    () => makeTestDatabase("browser"),
    () => "migrated",
  );
  await step(
    "demo",
    () => seedDemo(cluster, database),
    () => "made",
  );
  const env = {
    ...appEnvironment(cluster, database, port),
    NODE_ENV: "production",
    EVENRAIL_BUILD_FOLDER: testedBuild,
  };
  const application = await step(
    "application",
    () => serve("start", port, env),
    () => "ready",
  );
  const log = createWriteStream(localFile("application-under-test.log"));
  application.pass((text) => log.write(text));
  return { cluster, database, application };
}
