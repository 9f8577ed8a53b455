import "server-only";
import { randomInt } from "node:crypto";

// Digits and letters that are not taken for one another when read aloud or typed from paper: 32 of them, 5 bits each.
const signs = "0123456789ABCDEFGHJKMNPQRSTVWXYZ";
const groups = 4;
const groupLength = 4;

/** 80 random bits in four groups: 7F3K-20QX-M9TD-HV5B. */
export function makeVerificationCode(): string {
  const group = () => Array.from({ length: groupLength }, () => signs[randomInt(signs.length)]).join("");
  return Array.from({ length: groups }, group).join("-");
}
