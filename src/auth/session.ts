import "server-only";
import { createHash, randomBytes } from "node:crypto";
import { Lucia } from "lucia";
import { sessionsAdapter } from "./sessions-adapter";

declare module "lucia" {
  interface Register {
    Lucia: ReturnType<typeof makeLucia>;
    DatabaseSessionAttributes: { authenticatedAt?: Date; browser: string };
    DatabaseUserAttributes: { name: string };
  }
}

function makeLucia() {
  return new Lucia(sessionsAdapter(), {
    sessionCookie: {
      name: "__Host-evenrail",
      expires: false,
      attributes: { secure: true, sameSite: "lax", path: "/" },
    },
    getSessionAttributes: ({ authenticatedAt }) => ({ authenticatedAt }),
    getUserAttributes: ({ name }) => ({ name }),
  });
}

let made: ReturnType<typeof makeLucia> | undefined;

export function lucia() {
  made ??= makeLucia();
  return made;
}

/** lucia stores what it is given as the key, so it is given the hash and the cookie keeps the token. */
export function sessionIdOf(token: string): string {
  return createHash("sha256").update(token).digest("hex");
}

/** A new sign-in; answers the cookie that carries its token. */
export async function startSession(personId: string, browser: string) {
  const token = randomBytes(32).toString("base64url");
  await lucia().createSession(personId, { browser }, { sessionId: sessionIdOf(token) });
  return lucia().createSessionCookie(token);
}

export async function endSession(sessionId: string) {
  await lucia().invalidateSession(sessionId);
  return lucia().createBlankSessionCookie();
}
