import { useRef, useState } from "react";
import { CallFailed } from "#src/components/islands/call.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { showToast } from "#src/components/islands/parts/toasts.ts";
import { dayWords } from "#src/costing/day-words.ts";
import type { RatesTaken } from "#src/server/take-reference-rates.ts";
import { fetchRates, takeRatesFile } from "./rates-store.ts";

function takenWords({ day, set, same, left }: RatesTaken): string {
  const rates = set.length === 1 ? "1 rate" : `${set.length} rates`;
  const done =
    set.length === 0 ? `The rates of ${dayWords(day)} were in already` : `${rates} of ${dayWords(day)} set`;
  const kept = set.length > 0 && same.length > 0 ? `, ${same.length} were in already` : "";
  return `${done}${kept}.${left.length > 0 ? ` Not read: ${left.join(", ")}.` : ""}`;
}

/** Ways to take a whole day's reference rates: a file, and the address in the settings where there is one. */
export function RatesSource({ workshop, canFetch }: { workshop: string; canFetch: boolean }) {
  const file = useRef<HTMLInputElement>(null);
  const [busy, setBusy] = useState<"file" | "fetch" | null>(null);

  async function take(how: "file" | "fetch", source: () => Promise<RatesTaken>) {
    setBusy(how);
    try {
      showToast({ text: takenWords(await source()) });
    } catch (error) {
      if (!(error instanceof CallFailed)) throw error;
      showToast({ kind: "fault", text: `${error.problem.title} ${error.problem.detail}` });
    } finally {
      setBusy(null);
    }
  }

  return (
    <>
      <input
        ref={file}
        type="file"
        accept=".xml,text/xml,application/xml"
        hidden
        aria-label="File of reference rates"
        onChange={({ currentTarget }) => {
          const [chosen] = currentTarget.files ?? [];
          currentTarget.value = "";
          if (chosen) void take("file", () => takeRatesFile(workshop, chosen));
        }}
      />
      <Button size="small" busy={busy === "file"} busyWord="Reading" onClick={() => file.current?.click()}>
        Bring in reference rates
      </Button>
      {canFetch && (
        <Button
          size="small"
          busy={busy === "fetch"}
          busyWord="Asking"
          onClick={() => void take("fetch", () => fetchRates(workshop))}
        >
          Fetch today’s
        </Button>
      )}
    </>
  );
}
