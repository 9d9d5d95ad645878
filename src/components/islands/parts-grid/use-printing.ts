import { useEffect, useState } from "react";
import { flushSync } from "react-dom";

/** Whether the page is being printed. It is drawn anew before the paper is taken, not after. */
export function usePrinting(): boolean {
  const [printing, setPrinting] = useState(false);
  useEffect(() => {
    const print = matchMedia("print");
    const changed = () => flushSync(() => setPrinting(print.matches));
    const begins = () => flushSync(() => setPrinting(true));
    const ends = () => setPrinting(false);
    print.addEventListener("change", changed);
    addEventListener("beforeprint", begins);
    addEventListener("afterprint", ends);
    return () => {
      print.removeEventListener("change", changed);
      removeEventListener("beforeprint", begins);
      removeEventListener("afterprint", ends);
    };
  }, []);
  return printing;
}
