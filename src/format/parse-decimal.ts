export type ParsedDecimal = { ok: true; value: number; decimals: number } | { ok: false; problem: string };

const grammar = /^([+\-\u2212]?)(\d*)(?:[.,](\d+))?$/;
/** Fifteen significant digits survive the way into a double and back unchanged. */
const mostDigits = 15;

/**
 * The one grammar of what a person may type as a number: blanks around it; a sign; digits with one decimal point or
 * one decimal comma. No exponents, hexadecimals, thousands separators, or digits of another script.
 */
export function parseDecimal(typed: string): ParsedDecimal {
  const text = typed.trim();
  if (text === "") return refuse("please type a number.");
  const match = grammar.exec(text);
  if (!match || (match[2] === "" && match[3] === undefined)) return refuse(problemOf(text));
  const [, sign = "", whole = "", fraction = ""] = match;
  if ((whole + fraction).replace(/^0+/, "").length > mostDigits)
    return refuse(`“${shortened(text)}” has more than ${mostDigits} digits.`);
  const size = Number(`${whole || "0"}.${fraction || "0"}`);
  const value = size === 0 || sign === "" || sign === "+" ? size : -size;
  return { ok: true, value, decimals: fraction.length };
}

function refuse(problem: string): ParsedDecimal {
  return { ok: false, problem };
}

function problemOf(text: string): string {
  const shown = `“${shortened(text)}”`;
  if (/^[+\-\u2212]?\d+[.,]$/.test(text)) return `${shown} ends with its decimal mark; please add a digit.`;
  if (/^[+\-\u2212]?[\d.,]+$/.test(text))
    return `${shown} has more than one decimal mark; please leave out thousands separators.`;
  if (/^[+\-\u2212]?[\d.,\s\u00a0\u202f'’_]+$/.test(text))
    return `${shown} is split; please type the digits without separators.`;
  if (/^[+\-\u2212]?[\d.,]+e[+\-\u2212]?\d+$/i.test(text))
    return `${shown} has an exponent; please write the digits out.`;
  if (/^[+\-\u2212]?[\d.,]+\s*\p{L}/u.test(text))
    return `${shown} holds letters; please type the number alone.`;
  return `${shown} is not a number such as 12.5 or 12,5.`;
}

function shortened(text: string): string {
  const signs = [...text];
  return signs.length <= 24 ? text : `${signs.slice(0, 23).join("")}…`;
}
