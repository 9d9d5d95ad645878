import type { ReactNode } from "react";
import { CautionIcon } from "./Icons.tsx";

export type BannerProps = { lead: string; children: ReactNode; action?: ReactNode };

/** A caution below the header that stays while it holds: a lost connection, invented data. Work goes on. */
export function Banner({ lead, children, action }: BannerProps) {
  return (
    <section aria-label={lead} data-screen-only className="border-b border-ink bg-caution-wash">
      <div className="gutters flex min-h-[55px] items-center gap-3 py-2 type-note max-tablet:flex-wrap">
        <CautionIcon className="size-[18px] text-caution [--cut:var(--color-caution-wash)]" />
        <p className="min-w-0 grow basis-0">
          <b>{lead}</b> {children}
        </p>
        {action && <div className="max-tablet:basis-full max-tablet:pl-[30px]">{action}</div>}
      </div>
    </section>
  );
}
