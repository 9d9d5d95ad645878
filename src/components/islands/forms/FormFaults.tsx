import { useEffect, useRef } from "react";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { ErrorBox } from "#src/components/islands/parts/ErrorBox.tsx";
import type { Form } from "./use-form.ts";

interface FormFaultsProps<Fields> {
  form: Form<Fields>;
  /** What could not be done: "The offer is not saved". */
  title: string;
  /** Differences of a clash, in words: "Freight: yours €4.90, theirs €5.50". */
  differences?: (fields: Fields, theirs: Partial<Fields>) => string[];
}

/** Above a form's fields: what is wrong with each, with a way to it; or what somebody else saved meanwhile. */
export function FormFaults<Fields>({ form, title, differences }: FormFaultsProps<Fields>) {
  const box = useRef<HTMLDivElement>(null);
  const { faults, failure, clash } = form;
  const shows = faults.length > 0 || failure !== null || clash !== null;
  useEffect(() => {
    if (shows) box.current?.focus();
  }, [shows]);
  if (!shows) return null;
  return (
    <div ref={box} tabIndex={-1} className="outline-none">
      <ErrorBox title={clash ? `${clash.changedBy ?? "Somebody"} changed this in the meantime` : title} alert>
        {failure && <p>{failure}</p>}
        <ul>
          {faults.map(({ at, message }) => (
            <li key={at + message}>
              <FaultLink id={form.words(at).id}>{placeOf(at) + message}</FaultLink>
            </li>
          ))}
          {clash && differences?.(form.fields, clash).map((line) => <li key={line}>{line}</li>)}
        </ul>
        {clash && (
          <div className="mt-3 flex flex-wrap gap-3">
            <Button size="small" onClick={() => form.settle("ours")}>
              Save mine over it
            </Button>
            <Button size="small" onClick={() => form.settle("theirs")}>
              Take theirs
            </Button>
          </div>
        )}
      </ErrorBox>
    </div>
  );
}

/** Rows that look alike are told apart by their place: "Row 2: ". */
function placeOf(at: string): string {
  const place = /\.(\d+)(\.|$)/.exec(at)?.[1];
  return place === undefined ? "" : `Row ${Number(place) + 1}: `;
}

/** A link that puts the focus into the field, where there is one. */
function FaultLink({ id, children }: { id: string; children: string }) {
  return (
    <a
      href={`#${id}`}
      onClick={(press) => {
        const field = document.getElementById(id);
        if (!field) return;
        press.preventDefault();
        field.focus();
      }}
    >
      {children}
    </a>
  );
}
