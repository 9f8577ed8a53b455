/** Start of the server process: what must hold before the first request. */
export async function register() {
  if (process.env.NEXT_RUNTIME !== "nodejs") return;
  const { prepareProcess } = await import("./start-up");
  prepareProcess();
}
