/** `1 day`, `2 days`, `3 injectors`, `2 entries`. */
export function plural(count: number, one: string, many: string = pluralOf(one)): string {
  return `${count} ${count === 1 ? one : many}`;
}

function pluralOf(one: string): string {
  if (/[^aeiou]y$/.test(one)) return `${one.slice(0, -1)}ies`;
  return /(?:s|x|z|ch|sh)$/.test(one) ? `${one}es` : `${one}s`;
}
