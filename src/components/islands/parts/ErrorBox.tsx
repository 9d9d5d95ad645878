import type { ReactNode } from "react";
import { BadIcon } from "./Icons.tsx";

export type ErrorCause = {
  key: string;
  /** "Line 21". */
  place?: ReactNode;
  /** "BT1". */
  what?: ReactNode;
  /** The reason, in bold: "Lumenhof's price from 250 up ended on 28 February." */
  reason: ReactNode;
  /** Why that matters. */
  detail?: ReactNode;
  /** Two ways on: a button and a quiet one. */
  ways?: ReactNode;
};

export type ErrorBoxProps = {
  /** What cannot be done. */
  title: string;
  causes?: readonly ErrorCause[];
  children?: ReactNode;
  /** Said at once: for a fault that follows an action. */
  alert?: boolean;
};

/** What cannot be done, each cause with its reason and two ways on. What is still known stands below it. */
export function ErrorBox({ title, causes = [], children, alert }: ErrorBoxProps) {
  return (
    <section
      role={alert ? "alert" : undefined}
      aria-label={title}
      className="border-[1.5px] border-l-10 border-bad bg-sheet px-6 py-4 max-tablet:border-l-[6px] max-tablet:px-4"
    >
      <h2 className="type-h2 flex items-start gap-3">
        <BadIcon className="mt-1 size-[22px] text-bad [--cut:var(--color-sheet)]" />
        {title}
      </h2>
      {children && <div className="mt-1">{children}</div>}
      {causes.map((cause) => (
        <Cause key={cause.key} cause={cause} />
      ))}
    </section>
  );
}

function Cause({ cause }: { cause: ErrorCause }) {
  return (
    <div className="hairline-t mt-2 flex gap-x-4 gap-y-1 pt-4 pb-2 max-tablet:flex-col tablet:items-center">
      {(cause.place || cause.what) && (
        <p className="flex shrink-0 gap-6 tablet:w-[196px]">
          <b>{cause.place}</b> {cause.what}
        </p>
      )}
      <p className="grow">
        <b className="block">{cause.reason}</b>
        <span className="text-ink-2">{cause.detail}</span>
      </p>
      {cause.ways && (
        <div className="type-table flex shrink-0 flex-col items-start gap-2 tablet:items-end">
          {cause.ways}
        </div>
      )}
    </div>
  );
}
