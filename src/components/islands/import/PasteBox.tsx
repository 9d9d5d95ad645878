import { useEffect, useRef, useState } from "react";
import { Button } from "../parts/Button.tsx";
import { QuietButton } from "../parts/QuietButton.tsx";
import { LongTextField } from "../parts/TextField.tsx";

/** Room for cells copied from a spreadsheet. */
export function PasteBox({ onText, onLeave }: { onText: (text: string) => void; onLeave: () => void }) {
  const [text, setText] = useState("");
  const [wrong, setWrong] = useState<string>();
  const box = useRef<HTMLFormElement>(null);
  useEffect(() => box.current?.querySelector("textarea")?.focus(), []);

  return (
    <form
      ref={box}
      className="flex flex-col gap-3"
      onSubmit={(submit) => {
        submit.preventDefault();
        if (text.trim() === "") setWrong("Paste at least one row.");
        else onText(text);
      }}
    >
      <LongTextField
        label="Pasted cells"
        hint="Copy the rows in your spreadsheet with their heading, and paste them here."
        rows={8}
        value={text}
        wrong={wrong}
        onChange={(change) => {
          setText(change.currentTarget.value);
          setWrong(undefined);
        }}
      />
      <p className="flex flex-wrap items-center gap-4">
        <Button type="submit">Read these cells</Button>
        <QuietButton onClick={onLeave}>Leave it</QuietButton>
      </p>
    </form>
  );
}
