import { announce, stayUntilStopped } from "./announce.mjs";
import { serve } from "./application.mjs";
import { applicationDatabase, demoSignIns } from "./application-database.mjs";
import { appEnvironment } from "./scripts.mjs";
import { runSession } from "./session.mjs";
import { setUp } from "./set-up.mjs";
import { step } from "./terminal.mjs";

await runSession(async () => {
  const { port, cluster } = await setUp("dev");
  const env = { ...appEnvironment(cluster, applicationDatabase, port), NODE_ENV: "development" };
  const application = await step(
    "application",
    () => serve("dev", port, env),
    () => "ready",
  );
  announce(port, await demoSignIns(cluster));
  await stayUntilStopped(application);
});
