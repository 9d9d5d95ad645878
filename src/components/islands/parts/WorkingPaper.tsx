import { Fragment, type ReactNode } from "react";
import {
  type Paper,
  type PaperLine,
  type PaperSource,
  type PaperSub,
  ruledOff,
} from "#src/components/working-paper.ts";

const ROW =
  "grid items-end min-h-7 grid-cols-[46px_minmax(0,1fr)_auto_20px_84px] pr-4 leading-7 tablet:grid-cols-[69px_minmax(0,1fr)_auto_28px_112px] tablet:pr-7";

/** The squared sheet itself: letters at the margin line, text, sub-amounts, sign, amount. */
export function WorkingPaper({ paper }: { paper: Paper }) {
  return (
    <section
      // biome-ignore lint/a11y/noNoninteractiveTabindex: a region that scrolls must be reachable by keyboard.
      tabIndex={0}
      aria-label={paper.of}
      className="squared-paper relative grow overflow-y-auto py-3.5 text-[1.0625rem]"
    >
      <div className="relative min-h-full before:absolute before:-inset-y-3.5 before:left-[45px] before:w-px before:bg-margin-line tablet:before:left-[68px]">
        <PaperText text={paper.basis} />
        <div className="h-7" />
        {paper.lines.map((line, place) => (
          // biome-ignore lint/suspicious/noArrayIndexKey: a line is its place on the sheet.
          <Fragment key={place}>
            {line.apart && <div className="h-7" />}
            <PaperRow line={line} ruled={ruledOff(paper.lines, place)} />
          </Fragment>
        ))}
        {paper.notes.map((note) => (
          <PaperText key={note} text={note} />
        ))}
        <Methods methods={paper.methods} />
      </div>
    </section>
  );
}

function PaperText({ text }: { text: string }) {
  return <p className="pr-7 pl-[60px] leading-7 text-ink-2 tablet:pl-[83px]">{text}</p>;
}

/** The rules a working follows, each explained on a page of its own. */
function Methods({ methods }: { methods: Paper["methods"] }) {
  if (methods.length === 0) return null;
  return (
    <p className="pr-7 pl-[60px] leading-7 text-ink-2 tablet:pl-[83px]" data-screen-only>
      How it is reckoned:{" "}
      {methods.map(({ label, href }, place) => (
        <Fragment key={href}>
          {place > 0 && ", "}
          <a href={href}>{label}</a>
        </Fragment>
      ))}
      .
    </p>
  );
}

function PaperRow({ line, ruled }: { line: PaperLine; ruled: boolean }) {
  const subs = line.subs ?? [];
  const strong = line.sign === "=" ? "font-semibold" : "";
  const amount = <Amount line={line} ruled={ruled} />;
  return (
    <>
      <div className={`${ROW} ${strong}`}>
        <span className="self-start pl-4 italic text-copper tablet:pl-7">{line.letter}</span>
        <span className="pl-3.5">
          {line.label} <Source source={line.source} />
        </span>
        <span />
        {subs.length === 0 && <Carried sign={line.sign}>{amount}</Carried>}
      </div>
      {subs.map((sub, place) => (
        <SubRow key={sub.label} sub={sub} last={place === subs.length - 1}>
          {place === subs.length - 1 && <Carried sign={line.sign}>{amount}</Carried>}
        </SubRow>
      ))}
    </>
  );
}

function SubRow({ sub, last, children }: { sub: PaperSub; last: boolean; children: ReactNode }) {
  return (
    <div className={ROW}>
      <span />
      <span className="pl-7 text-ink-2 tablet:pl-[42px]">
        {sub.label} <Source source={sub.source} />
      </span>
      <span
        className={`pl-3 text-right tablet:min-w-[84px] whitespace-nowrap text-ink-2 ${last ? "-mb-[1.5px] rule-head" : ""}`}
      >
        <Opens label={sub.label} amount={sub.amount} onOpen={sub.onOpen} />
      </span>
      {children}
    </div>
  );
}

function Carried({ sign, children }: { sign: PaperLine["sign"]; children: ReactNode }) {
  return (
    <>
      <span className="text-center">{sign}</span>
      {children}
    </>
  );
}

function Amount({ line, ruled }: { line: PaperLine; ruled: boolean }) {
  const rule = line.result
    ? "-mb-1 rule-result type-h3 font-bold leading-7"
    : ruled
      ? "-mb-[1.5px] rule-head"
      : "";
  return (
    <span className={`block text-right whitespace-nowrap ${rule}`}>
      {line.amount && <Opens label={line.label} amount={line.amount} onOpen={line.onOpen} />}
    </span>
  );
}

function Opens({ label, amount, onOpen }: { label: string; amount: string; onOpen?: () => void }) {
  if (!onOpen) return <>{amount}</>;
  return (
    <button
      type="button"
      onClick={onOpen}
      aria-label={`${label} ${amount}, show the working`}
      className="leading-5 foot-dotted hover:border-solid hover:border-petrol"
    >
      {amount}
    </button>
  );
}

function Source({ source }: { source?: PaperSource }) {
  if (!source) return null;
  return (
    <a href={source.href} className="type-table ml-1.5 font-normal whitespace-nowrap">
      {source.label}
    </a>
  );
}
