import "server-only";

type File = {
  bytes: Uint8Array;
  mediaType: string;
  /** Any name; what a header cannot carry is encoded (RFC 6266, RFC 8187). */
  name: string;
  /** Saved rather than shown. */
  saved?: boolean;
};

/** A stored file leaves with a fixed type and can neither run, be embedded elsewhere nor stay in a cache. */
export function fileResponse({ bytes, mediaType, name, saved = false }: File): Response {
  return new Response(new Uint8Array(bytes), {
    headers: {
      "Content-Type": mediaType,
      "Content-Length": String(bytes.length),
      "Content-Disposition": `${saved ? "attachment" : "inline"}; ${nameParameters(name)}`,
      "Content-Security-Policy": "sandbox; default-src 'none'",
      "Cross-Origin-Resource-Policy": "same-origin",
      "X-Content-Type-Options": "nosniff",
      "Cache-Control": "private, no-store",
    },
  });
}

function nameParameters(name: string): string {
  const label = name.normalize("NFC").replace(/[\p{Cc}\p{Cf}\p{Cs}/\\]/gu, "");
  const plain = label.replace(/[^\x20-\x7e]|["%;]/g, "_");
  const encoded = encodeURIComponent(label).replace(
    /['()*]/g,
    (sign) => `%${sign.charCodeAt(0).toString(16).toUpperCase()}`,
  );
  return `filename="${plain}"; filename*=UTF-8''${encoded}`;
}
