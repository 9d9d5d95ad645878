import { DownIcon, UpIcon } from "#src/components/islands/parts/Icons.tsx";

/** Moves a row up or down; at the end of the list it is off. */
export function OrderKey({
  label,
  off,
  onPress,
  up,
}: {
  label: string;
  off: boolean;
  onPress: () => void;
  up?: boolean;
}) {
  const Icon = up ? UpIcon : DownIcon;
  return (
    <button
      type="button"
      aria-label={label}
      aria-disabled={off || undefined}
      onClick={off ? undefined : onPress}
      className={`flex size-10 items-center justify-center rounded-control border-[1.5px] ${off ? "border-dashed border-rule-2 bg-tint text-ink-2" : "border-ink bg-sheet hover:bg-petrol-wash"}`}
    >
      <Icon />
    </button>
  );
}
