import type { ComponentProps } from "react";
import { WORKING_LOOK } from "#src/components/button-look.ts";
import { EqualsIcon } from "./Icons.tsx";

export type ShowWorkingProps = Omit<ComponentProps<"button">, "children"> & {
  /** What is worked out, for those who hear the page: "cost per kit by run size". */
  of: string;
  open?: boolean;
  label?: string;
};

/** Opens a working, or the table behind a chart. */
export function ShowWorking({ of, open, label = "Show the working", className, ...rest }: ShowWorkingProps) {
  return (
    <button type="button" aria-expanded={open} {...rest} className={`${WORKING_LOOK} ${className ?? ""}`}>
      <EqualsIcon className="size-4" />
      {label}
      <span className="heard-only"> of {of}</span>
    </button>
  );
}
