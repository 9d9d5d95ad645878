export type FigureProps = {
  /** Heard before the value: "Cost per kit". */
  label: string;
  /** Written as it stands: "€14.95". */
  value: string;
  /** Opens the working. Without it the figure has no dotted foot. */
  onOpen?: () => void;
  open?: boolean;
  /** The panel it opens, for assistive technology. */
  controls?: string;
  className?: string;
};

/** A figure. One that opens its arithmetic has a dotted foot. */
export function Figure({ label, value, onOpen, open, controls, className = "" }: FigureProps) {
  if (onOpen === undefined) return <span className={className}>{value}</span>;
  return (
    <button
      type="button"
      aria-label={`${label} ${value}, show the working`}
      aria-expanded={open}
      aria-controls={open ? controls : undefined}
      onClick={onOpen}
      className={`foot-dotted cursor-pointer print:border-0 hover:border-solid hover:border-petrol focus-visible:border-solid focus-visible:border-petrol ${open ? "border-solid! border-petrol! bg-petrol-wash" : ""} ${className}`}
    >
      {value}
    </button>
  );
}
