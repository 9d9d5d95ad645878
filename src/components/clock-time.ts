/** Hours and minutes of a moment in milliseconds since 1970, where the reader is: "14:41". In browsers alone. */
export function clockTime(at: number): string {
  return new Date(at).toLocaleTimeString("en-GB", { hour: "2-digit", minute: "2-digit" });
}
