import { type DragEvent, type ReactNode, useRef, useState } from "react";
import { Button } from "./Button.tsx";

export type DropAreaProps = {
  title: string;
  children: ReactNode;
  /** What the file dialog offers: ".csv,.tsv". */
  accept: string;
  onFile: (file: File) => void;
  onPaste?: () => void;
  picture?: ReactNode;
  /** Heading level within the page. */
  level?: 2 | 3;
  chooseLabel?: string;
  pasteLabel?: string;
};

/** Where a file is dropped, chosen or pasted. The dashed ink line is the edge of the target. */
export function DropArea({
  title,
  children,
  accept,
  onFile,
  onPaste,
  picture,
  level = 2,
  ...labels
}: DropAreaProps) {
  const [over, setOver] = useState(false);
  const input = useRef<HTMLInputElement>(null);
  const Heading = `h${level}` as const;

  function drop(event: DragEvent) {
    event.preventDefault();
    setOver(false);
    const file = event.dataTransfer.files[0];
    if (file) onFile(file);
  }

  return (
    // biome-ignore lint/a11y/useSemanticElements: a target for the pointer; the two buttons in it do the same.
    <div
      role="group"
      aria-label={title}
      onDragOver={(event) => {
        event.preventDefault();
        setOver(true);
      }}
      onDragLeave={() => setOver(false)}
      onDrop={drop}
      className={`flex gap-x-11 gap-y-6 rounded-control border-2 border-dashed border-ink px-5 py-6 max-tablet:flex-col tablet:items-center tablet:px-14 tablet:py-10 ${over ? "bg-petrol-wash" : "bg-sheet"}`}
    >
      {picture}
      <div className="grow">
        <Heading className="type-h2">{title}</Heading>
        <div className="measure-prose mt-1">{children}</div>
        <div className="mt-4 flex flex-wrap gap-3 max-tablet:flex-col">
          <Button kind="primary" onClick={() => input.current?.click()}>
            {labels.chooseLabel ?? "Choose a file"}
          </Button>
          {onPaste && <Button onClick={onPaste}>{labels.pasteLabel ?? "Paste from a spreadsheet"}</Button>}
        </div>
        <input
          ref={input}
          type="file"
          accept={accept}
          tabIndex={-1}
          aria-hidden="true"
          className="hidden"
          onChange={(change) => {
            const file = change.currentTarget.files?.[0];
            if (file) onFile(file);
            change.currentTarget.value = "";
          }}
        />
      </div>
    </div>
  );
}
