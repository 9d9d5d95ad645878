import { useEffect, useState } from "react";

const WAIT_MS = 300;
const BARS = ["w-3/5", "w-4/5", "w-1/2", "w-3/4"];

/** Nothing for 300 ms, then the section's ruled lines with bars where text will stand. It does not move. */
export function Loading({
  rows = 3,
  what,
  frame,
}: {
  rows?: number;
  /** "Offers". */
  what: string;
  /** Classes of the box around the lines, where what is fetched will lie over the page. */
  frame?: string;
}) {
  const [late, setLate] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setLate(true), WAIT_MS);
    return () => clearTimeout(timer);
  }, []);
  return (
    <div role="status" aria-busy="true">
      <span className="heard-only">Loading: {what}</span>
      {late && (
        <div className={frame}>
          <LoadingLines rows={rows} />
        </div>
      )}
    </div>
  );
}

/** The ruled lines alone. */
export function LoadingLines({ rows = 3 }: { rows?: number }) {
  return (
    <div aria-hidden="true" className="border-t-[1.5px] border-ink">
      {Array.from({ length: rows }, (_, place) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: the lines differ by nothing else.
        <div key={place} className="hairline-b flex h-[35px] items-center gap-5">
          <span className="h-3 w-[15%] bg-tint" />
          <span className="grow">
            <span className={`block h-3 bg-tint ${BARS[place % BARS.length]}`} />
          </span>
          <span className="h-3 w-[19%] bg-tint" />
        </div>
      ))}
    </div>
  );
}
