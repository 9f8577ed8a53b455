import { randomBytes, randomUUID } from "node:crypto";
import { type NextRequest, NextResponse } from "next/server";

/**
 * Gives each request an id and a nonce, and each answer its security headers. It decides nothing about rights:
 * src/data does.
 */
export function proxy(request: NextRequest) {
  const nonce = randomBytes(16).toString("base64");
  const policy = contentSecurityPolicy(nonce);
  const forwarded = new Headers(request.headers);
  forwarded.set("x-request-id", randomUUID());
  forwarded.set("content-security-policy", policy);
  forwarded.set("x-nonce", nonce);
  // Where to come back to after signing in; a layout is not told its own path.
  forwarded.set("x-path", request.nextUrl.pathname + request.nextUrl.search);
  const response = NextResponse.next({ request: { headers: forwarded } });
  for (const [name, value] of Object.entries({ ...fixed, "Content-Security-Policy": policy }))
    response.headers.set(name, value);
  return response;
}

const fixed = {
  "X-Content-Type-Options": "nosniff",
  "Referrer-Policy": "same-origin",
  "Cross-Origin-Opener-Policy": "same-origin",
  "Permissions-Policy": "camera=(self), microphone=(), geolocation=()",
};

function contentSecurityPolicy(nonce: string): string {
  const development = process.env.NODE_ENV === "development";
  return [
    "default-src 'self'",
    `script-src 'nonce-${nonce}' 'strict-dynamic'${development ? " 'unsafe-eval'" : ""}`,
    "style-src 'self' 'unsafe-inline'",
    "img-src 'self' blob: data:",
    "font-src 'self' data:",
    "connect-src 'self'",
    "object-src 'none'",
    "base-uri 'none'",
    "form-action 'self'",
    "frame-ancestors 'none'",
  ].join("; ");
}

/** Uploads stay outside: a proxy would cut their bodies at 10 MB. They and all files set their own headers. */
export const config = { matcher: ["/((?!_next/static|api/files|fonts/|icon).*)"] };
