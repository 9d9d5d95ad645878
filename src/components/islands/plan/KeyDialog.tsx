import { useRef } from "react";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { holdFocus, useModal } from "#src/components/islands/parts/held-focus.ts";

const KEYS: readonly [string, string][] = [
  ["Alt and +, Alt and −", "one kit more or less, from anywhere"],
  ["Arrow keys on the ruler", "one kit more or less"],
  ["Shift and arrow on the ruler", "the next sweet spot"],
  ["Page up, Page down on the ruler", "ten kits more or less"],
  ["Home, End on the ruler", "10 kits, 500 kits"],
  ["Arrow up, arrow down in an amount", "0.10 more or less; with Shift 1.00"],
  ["Arrow keys in a chart", "from run size to run size, read out"],
  ["Enter on a figure with a dotted foot", "its working"],
  ["Escape", "closes the working; leaves a field as it was"],
  ["?", "these keys"],
];

/** The keys that work on every page of a kit, while it is open. */
export function KeyDialog({ onClose }: { onClose: () => void }) {
  const close = useRef<HTMLButtonElement>(null);
  const box = useModal(true, close);
  return (
    <dialog
      ref={box}
      aria-label="Keys"
      onKeyDown={holdFocus}
      onCancel={(cancel) => {
        cancel.preventDefault();
        onClose();
      }}
      className="m-auto w-[min(560px,calc(100vw-2rem))] rounded-control border-2 border-ink bg-paper px-6 py-5 text-ink"
    >
      <div className="flex items-center justify-between gap-4">
        <h2 className="type-h2">Keys</h2>
        <Button ref={close} size="small" onClick={onClose}>
          Close
        </Button>
      </div>
      <dl className="mt-3 type-table">
        {KEYS.map(([keys, what]) => (
          <div key={keys} className="hairline-b flex flex-wrap justify-between gap-x-6 py-2">
            <dt className="font-semibold">{keys}</dt>
            <dd className="text-ink-2">{what}</dd>
          </div>
        ))}
      </dl>
    </dialog>
  );
}
