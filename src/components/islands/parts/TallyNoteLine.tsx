import { QuietButton } from "./QuietButton.tsx";
import type { TallyNote } from "./TallyStrip.tsx";

/** Names the edit whose changes are shown, with what can be done about it. */
export function TallyNoteLine({ note, className }: { note: TallyNote; className?: string }) {
  return (
    <div className={`border-t border-rule-2 bg-sheet ${className ?? ""}`}>
      <p className="gutters type-label flex min-h-[31px] flex-wrap items-center gap-x-4">
        <span>
          <b>{note.edit}</b> {note.text}
        </span>
        {note.actions?.map((action) => (
          <QuietButton key={action.label} onClick={action.run} className="font-normal">
            {action.label}
          </QuietButton>
        ))}
      </p>
    </div>
  );
}
