import { ToolFailure } from "../failure.mjs";
import { runTool } from "../processes.mjs";
import { inProject } from "../project.mjs";
import { complain } from "../terminal.mjs";

/** Runs an installed tool and shows what it says as it says it; answers whether it ended badly. */
export async function endsBadly(program, args, env = process.env) {
  const colours = process.stdout.isTTY ? { FORCE_COLOR: "1" } : {};
  const command = [inProject("node_modules", ".bin", program), ...args];
  return failsShown(() =>
    runTool(program, command, {
      env: { ...env, ...colours },
      onOutput: (text) => process.stdout.write(text),
    }),
  );
}

/** Shown already, a tool's failure only counts; anything else is not a result and goes on up. */
export async function failsShown(work) {
  try {
    await work();
    return false;
  } catch (error) {
    if (!(error instanceof ToolFailure)) throw error;
    complain(`${error.message}.`);
    return true;
  }
}
