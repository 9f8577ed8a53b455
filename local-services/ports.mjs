import { createServer } from "node:net";
import { Refusal } from "./failure.mjs";

const defaultPort = 3000;

export function freePort() {
  return listenBriefly(0);
}

/** The port the person asked for, free at this moment. */
export async function requirePort() {
  const wanted = Number(process.env.PORT ?? defaultPort);
  if (!Number.isInteger(wanted) || wanted < 1 || wanted > 65_535)
    throw new Refusal(`PORT is "${process.env.PORT}": it must be a whole number from 1 to 65535.`);
  try {
    return await listenBriefly(wanted);
  } catch (error) {
    throw new Refusal(sentenceFor(error, wanted), { cause: error });
  }
}

function sentenceFor(error, port) {
  const another = `PORT=${port < 1024 ? defaultPort : port + 1} npm start`;
  if (error.code === "EACCES")
    return `This user may not open port ${port}: choose one from 1024 up, such as ${another}`;
  return `Port ${port} is taken by another program: stop that one, or run ${another}`;
}

function listenBriefly(port) {
  return new Promise((resolve, reject) => {
    const server = createServer().once("error", reject);
    server.listen({ port, host: "127.0.0.1", exclusive: true }, () => {
      const { port: given } = server.address();
      server.close(() => resolve(given));
    });
  });
}
