import type { ButtonHTMLAttributes } from "react";
import { QUIET_LOOK } from "#src/components/button-look.ts";

/** The second choice beside a button: words in petrol, underlined. */
export function QuietButton({ className, ...rest }: ButtonHTMLAttributes<HTMLButtonElement>) {
  return <button type="button" {...rest} className={`${QUIET_LOOK} min-h-6 ${className ?? ""}`} />;
}
