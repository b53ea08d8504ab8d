/** One spelling for names that typesetting writes in many ways; the length never changes, so offsets stay exact. */

const HYPHENS = new Set("‐‑‒–—−﹣－­".split(""));
const PRIMES = new Set("′’‘ʹ´`＇".split(""));
const SPACES = new Set([..."             　"]);

/** The character as names are filed: hyphens, primes and spaces of every kind in their plain form. */
export function plainCharacter(c: string): string {
  if (c < "\u0080") return c === "`" ? "'" : c;
  if (HYPHENS.has(c)) return "-";
  if (PRIMES.has(c)) return "'";
  if (SPACES.has(c)) return " ";
  return c;
}

/** The text with every character in its plain form; same length. */
export function plainText(text: string): string {
  let plain = "";
  for (let i = 0; i < text.length; i++) plain += plainCharacter(text[i] as string);
  return plain;
}

export function isLetter(c: string | undefined): boolean {
  if (c === undefined) return false;
  return (
    (c >= "a" && c <= "z") ||
    (c >= "A" && c <= "Z") ||
    (c > "\u00bf" && c !== "×" && c !== "÷" && c.toLowerCase() !== c.toUpperCase())
  );
}

export function isDigit(c: string | undefined): boolean {
  return c !== undefined && c >= "0" && c <= "9";
}

export function isWordCharacter(c: string | undefined): boolean {
  return isLetter(c) || isDigit(c);
}
