export type FilterChoice = { value: string; label: string; count?: number };

export type FilterGroupProps = {
  /** What is filtered: "Lines". */
  label: string;
  choices: readonly FilterChoice[];
  value: string;
  onChoose: (value: string) => void;
};

/** Joined buttons; the chosen one is ink. The count stands inside: "To settle 3". */
export function FilterGroup({ label, choices, value, onChoose }: FilterGroupProps) {
  return (
    <fieldset
      data-screen-only
      className="inline-flex max-w-full flex-wrap rounded-control border-[1.5px] border-ink bg-sheet"
    >
      <legend className="heard-only">{label}</legend>
      {choices.map((choice, place) => (
        <button
          key={choice.value}
          type="button"
          aria-pressed={choice.value === value}
          onClick={() => onChoose(choice.value)}
          className={`type-label min-h-[41px] grow px-4 font-semibold ${place > 0 ? "border-l-[1.5px] border-ink" : ""} ${choice.value === value ? "bg-ink text-paper" : "hover:bg-petrol-wash"}`}
        >
          {choice.label}
          {choice.count !== undefined && ` ${choice.count}`}
        </button>
      ))}
    </fieldset>
  );
}
