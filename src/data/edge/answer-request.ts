import "server-only";
import { isRefusal, type Refusal, type RefusalKind } from "../access/errors";
import { reportUnexpected } from "./report-unexpected";

const statusOf: Record<RefusalKind, number> = {
  "not found": 404,
  "sign-in needed": 401,
  forbidden: 403,
  invalid: 422,
  conflict: 409,
  refused: 409,
  "confirm who you are": 403,
  busy: 503,
};

const headers = { "Cache-Control": "private, no-store" };

/** Runs a handler's verb: JSON or the handler's own response, and a problem document (RFC 9457) for a refusal. */
export async function answerRequest(verb: () => Promise<unknown>): Promise<Response> {
  try {
    const result = await verb();
    return result instanceof Response ? result : Response.json(result ?? null, { headers });
  } catch (error) {
    if (isRefusal(error)) return problem(error);
    const reference = reportUnexpected(error);
    return Response.json(
      { type: "about:blank", title: "Something went wrong on our side.", status: 500, reference },
      { status: 500, headers: { ...headers, "Content-Type": "application/problem+json" } },
    );
  }
}

function problem(error: Refusal): Response {
  const status = statusOf[error.kind];
  const retry: Record<string, string> = isRefusal(error, "busy")
    ? { "Retry-After": String(error.details.retryAfterSeconds) }
    : {};
  return Response.json(
    {
      type: `urn:evenrail:${error.kind.replaceAll(" ", "-")}`,
      title: error.message,
      status,
      ...error.details,
    },
    { status, headers: { ...headers, ...retry, "Content-Type": "application/problem+json" } },
  );
}
