import { ensureBuild, servedBuild } from "./build.mjs";
import { Refusal } from "./failure.mjs";
import { running } from "./only-one.mjs";
import { runSession } from "./session.mjs";
import { say } from "./terminal.mjs";

/** `npm run build`: never over a build that is being served. */
await runSession(async () => {
  const served = running("start");
  if (served) throw new Refusal(`The build is being served at ${served.address}: stop npm start first.`);
  say(await ensureBuild(servedBuild, (text) => process.stdout.write(text)));
});
