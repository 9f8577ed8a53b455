/** One form for all spellings of an address, so that two of them are one account. */
export function canonicalEmail(email: string): string {
  return email.normalize("NFKC").trim().toLowerCase();
}
