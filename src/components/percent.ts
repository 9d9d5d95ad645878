/** Rates are kept as decimals ("0.029") and shown in hundredths ("2.9"); both ways by moving the point, exactly. */

function parts(text: string): { whole: string; after: string } {
  const [whole = "", after = ""] = text.split(".");
  return { whole, after };
}

function tidy(whole: string, after: string): string {
  const plain = whole.replace(/^0+(?=\d)/, "") || "0";
  const rest = after.replace(/0+$/, "");
  return rest ? `${plain}.${rest}` : plain;
}

/** "0.029" → "2.9" */
export function toPercent(rate: string): string {
  const { whole, after } = parts(rate);
  const padded = after.padEnd(2, "0");
  return tidy(whole + padded.slice(0, 2), padded.slice(2));
}

/** "2.9" → "0.029" */
export function fromPercent(percent: string): string {
  const { whole, after } = parts(percent);
  const padded = whole.padStart(3, "0");
  return tidy(padded.slice(0, -2), padded.slice(-2) + after);
}
