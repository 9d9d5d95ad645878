import { useEffect, useRef, useState } from "react";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { CheckBox } from "#src/components/islands/parts/CheckBox.tsx";
import { useStore } from "#src/components/islands/plan/module-store.ts";
import { MONEY_COLUMNS } from "./cell-text.ts";
import { MORE_COLUMNS, moreColumns, showColumn } from "./more-columns.ts";

/** Which columns stand in the grid besides the usual ones. */
export function ColumnsMenu({ money }: { money: boolean }) {
  const [open, setOpen] = useState(false);
  const shown = useStore(moreColumns, []);
  const box = useRef<HTMLDivElement>(null);
  const key = useRef<HTMLButtonElement>(null);
  useEffect(() => {
    if (!open) return;
    const away = (event: Event) => {
      if (event.target instanceof Node && !box.current?.contains(event.target)) setOpen(false);
    };
    const leave = (press: KeyboardEvent) => {
      if (press.key !== "Escape") return;
      setOpen(false);
      key.current?.focus();
    };
    document.addEventListener("pointerdown", away);
    document.addEventListener("focusin", away);
    document.addEventListener("keydown", leave);
    return () => {
      document.removeEventListener("keydown", leave);
      document.removeEventListener("pointerdown", away);
      document.removeEventListener("focusin", away);
    };
  }, [open]);

  const choices = MORE_COLUMNS.filter((column) => money || !MONEY_COLUMNS.includes(column.key));
  return (
    <div ref={box} className="relative">
      <Button ref={key} size="small" aria-expanded={open} onClick={() => setOpen(!open)}>
        Columns
      </Button>
      {open && (
        <fieldset className="absolute top-full left-0 z-20 mt-1 w-64 animate-menu border-2 border-ink bg-paper px-4 py-2">
          <legend className="heard-only">More columns</legend>
          {choices.map((column) => (
            <CheckBox
              key={column.key}
              label={column.label}
              checked={shown.includes(column.key)}
              onChange={({ currentTarget }) => showColumn(column.key, currentTarget.checked)}
            />
          ))}
        </fieldset>
      )}
    </div>
  );
}
