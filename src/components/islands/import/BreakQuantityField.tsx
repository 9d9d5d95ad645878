import { useState } from "react";
import { TextField } from "../parts/TextField.tsx";

interface Props {
  /** The column it belongs to. */
  name: string;
  quantity: number | null;
  onQuantity: (quantity: number) => void;
}

const SAYS = "Write a whole number of at least 1.";

/** From which quantity on the price of a column holds. */
export function BreakQuantityField({ name, quantity, onQuantity }: Props) {
  const [draft, setDraft] = useState<string | null>(null);
  const [wrong, setWrong] = useState<string>();

  function take(text: string) {
    const read = /^\d{1,9}$/.test(text.trim()) ? Number(text) : 0;
    setWrong(read < 1 ? SAYS : undefined);
    if (read < 1) return;
    setDraft(null);
    if (read !== quantity) onQuantity(read);
  }

  return (
    <TextField
      label={`${name} holds from`}
      labelHidden
      hint="pieces or more"
      className="mt-1.5 font-normal"
      row
      inputMode="numeric"
      wrong={wrong ?? (quantity === null && draft === null ? "From how many pieces?" : undefined)}
      value={draft ?? (quantity === null ? "" : String(quantity))}
      onChange={(change) => setDraft(change.currentTarget.value)}
      onBlur={(leave) => draft !== null && take(leave.currentTarget.value)}
      onKeyDown={(press) => press.key === "Enter" && take(press.currentTarget.value)}
    />
  );
}
