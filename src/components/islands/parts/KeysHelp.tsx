import { useEffect, useRef, useState } from "react";
import { Button } from "./Button.tsx";
import { CheckBox } from "./CheckBox.tsx";
import { holdFocus, useModal } from "./held-focus.ts";
import { opensKeys, setSingleKeys, singleKeysOn } from "./single-keys.ts";

export type KeyWords = { keys: string; does: string };

/** Keys that work on every page of a kit; a page adds its own. */
export const KIT_KEYS: readonly KeyWords[] = [
  { keys: "Alt and +", does: "one kit more in the run" },
  { keys: "Alt and −", does: "one kit less in the run" },
  { keys: "Shift and arrow, on the ruler", does: "the next sweet spot" },
  { keys: "Page up, page down, on the ruler", does: "ten kits more or less" },
  { keys: "Escape", does: "closes a working, leaves a cell as it was" },
  { keys: "?", does: "this list" },
];

/** A question mark lists the keys. Keys of a single letter or sign can be turned off here. */
export default function KeysHelp({ keys = KIT_KEYS }: { keys?: readonly KeyWords[] }) {
  const [open, setOpen] = useState(false);
  const [single, setSingle] = useState(true);
  const closeKey = useRef<HTMLButtonElement>(null);
  const box = useModal(open, closeKey);
  const close = () => setOpen(false);

  useEffect(() => {
    setSingle(singleKeysOn(localStorage));
    const onKey = (press: KeyboardEvent) => opensKeys(press, localStorage) && setOpen(true);
    addEventListener("keydown", onKey);
    return () => removeEventListener("keydown", onKey);
  }, []);

  return (
    <dialog
      ref={box}
      aria-label="Keys"
      onKeyDown={holdFocus}
      onCancel={(cancel) => {
        cancel.preventDefault();
        close();
      }}
      className="m-auto w-[min(560px,calc(100vw-2rem))] rounded-control border-2 border-ink bg-paper px-6 py-5 text-ink"
    >
      {open && (
        <>
          <div className="flex items-center justify-between gap-4">
            <h2 className="type-h2">Keys</h2>
            <Button ref={closeKey} size="small" onClick={close}>
              Close
            </Button>
          </div>
          <dl className="mt-2">
            {keys.map(({ keys: press, does }) => (
              <div
                key={press}
                className="hairline-b flex min-h-10 flex-wrap items-center justify-between gap-x-4 py-1"
              >
                <dt className="font-semibold">{press}</dt>
                <dd className="text-ink-2">{does}</dd>
              </div>
            ))}
          </dl>
          <CheckBox
            className="mt-3"
            label="Keys of a single sign, such as ?, are on in this browser"
            checked={single}
            onChange={(change) => {
              setSingle(change.currentTarget.checked);
              setSingleKeys(localStorage, change.currentTarget.checked);
            }}
          />
          {!single && <p className="type-label text-ink-2">Alt and ? still lists the keys.</p>}
        </>
      )}
    </dialog>
  );
}
