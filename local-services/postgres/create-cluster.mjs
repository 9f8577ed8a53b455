import { chownSync, existsSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { runTool } from "../processes.mjs";
import { serverAccount } from "./account.mjs";
import { claimFolder, dataFolder } from "./cluster-folder.mjs";
import { findInstallation } from "./installation.mjs";
import { passwordsOf, roles } from "./passwords.mjs";

/** Makes the cluster when there is none; a run that is cut short leaves nothing that counts as one. */
export async function createCluster(folder) {
  claimFolder(folder);
  const data = dataFolder(folder);
  if (existsSync(data)) return findInstallation(majorOf(data));
  const installation = await findInstallation();
  const account = serverAccount();
  const unfinished = `${data}.unfinished`;
  rmSync(unfinished, { recursive: true, force: true });
  mkdirSync(unfinished, { mode: 0o700 });
  giveTo(account, unfinished);
  await initialise(installation, account, unfinished, passwordsOf(folder).superuser);
  renameSync(unfinished, data);
  return installation;
}

async function initialise({ bin }, account, data, password) {
  const passwordFile = `${data}.password`;
  writeFileSync(passwordFile, password, { mode: 0o600 });
  giveTo(account, passwordFile);
  try {
    await runTool(
      "initdb",
      [
        join(bin, "initdb"),
        `--pgdata=${data}`,
        `--username=${roles.superuser}`,
        `--pwfile=${passwordFile}`,
        "--auth-host=scram-sha-256",
        "--auth-local=reject",
        "--encoding=UTF8",
        "--locale=C.UTF-8",
        "--data-checksums",
        "--no-instructions",
      ],
      { cwd: "/", account },
    );
  } finally {
    rmSync(passwordFile, { force: true });
  }
}

function giveTo(account, path) {
  if (account) chownSync(path, account.uid, account.gid);
}

function majorOf(data) {
  return Number(readFileSync(join(data, "PG_VERSION"), "utf8"));
}
