import { useEffect, useState } from "react";

/** A text that follows the given one once it has stood still for so long: for what is read out. */
export function useQuiet(text: string, quietMs: number): string {
  const [said, setSaid] = useState("");
  useEffect(() => {
    const timer = setTimeout(() => setSaid(text), quietMs);
    return () => clearTimeout(timer);
  }, [text, quietMs]);
  return said;
}
