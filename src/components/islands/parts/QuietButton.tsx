import type { ComponentProps } from "react";
import { QUIET_LOOK } from "#src/components/button-look.ts";

/** The second choice beside a button: words in petrol, underlined. */
export function QuietButton({ className, ...rest }: ComponentProps<"button">) {
  return <button type="button" {...rest} className={`${QUIET_LOOK} min-h-6 ${className ?? ""}`} />;
}
