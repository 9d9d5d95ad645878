import { Button } from "./Button.tsx";
import { CautionIcon } from "./Icons.tsx";

export type ConflictBoxProps = {
  /** "Tom changed this price at 14:40." */
  happened: string;
  /** What each wrote: "€33.00", "€34.00". */
  yours: string;
  theirs: string;
  /** "His", "Hers", "Theirs", or the name: "Tom's". */
  theirWord: string;
  onKeepYours: () => void;
  onTakeTheirs: () => void;
};

/** Two people changed the same thing: both values, and two buttons. Nothing is lost before one is chosen. */
export function ConflictBox({
  happened,
  yours,
  theirs,
  theirWord,
  onKeepYours,
  onTakeTheirs,
}: ConflictBoxProps) {
  return (
    <div role="alert" className="border-[1.5px] border-ink bg-caution-wash px-4 py-3 type-note">
      <p className="flex gap-3">
        <CautionIcon className="mt-[3px] size-[18px] text-caution [--cut:var(--color-caution-wash)]" />
        <span>
          {happened} Yours: <b>{yours}</b>. {theirWord}: <b>{theirs}</b>.
        </span>
      </p>
      <div className="mt-3 flex flex-wrap gap-3 pl-[30px]">
        <Button size="small" onClick={onKeepYours}>
          Keep {yours}
        </Button>
        <Button size="small" onClick={onTakeTheirs}>
          Take {theirs}
        </Button>
      </div>
    </div>
  );
}
