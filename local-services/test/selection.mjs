import { Refusal } from "../failure.mjs";
import { parts } from "./parts.mjs";

const names = Object.keys(parts);

/** `npm test -- data build` runs these parts; what follows the parts' names goes to the one part's runner. */
export function select(words) {
  const end = words.findIndex((word) => !names.includes(word));
  const chosen = end === -1 ? words : words.slice(0, end);
  const args = end === -1 ? [] : words.slice(end);
  if (args.length > 0 && !(chosen.length === 1 && parts[chosen[0]].takesArguments))
    throw new Refusal(`"${args[0]}" is no part of the tests: the parts are ${names.join(", ")}.`);
  return (chosen.length > 0 ? chosen : names).map((name) => ({ name, ...parts[name], args }));
}
