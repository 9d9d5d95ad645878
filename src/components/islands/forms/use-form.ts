import { type FormEvent, useId, useState } from "react";
import { CallFailed } from "#src/components/islands/call.ts";
import type { FieldError } from "#src/server/problem.ts";

/** What another person saved while this form was open. */
export type FormClash<Fields> = Partial<Fields> & { version: number; changedBy?: string | null };

export interface Form<Fields> {
  fields: Fields;
  set: (change: Partial<Fields>) => void;
  /** Words of the field with this path: its id, and what would be right. */
  words: (path: string) => { id: string; wrong: string | undefined };
  faults: readonly FieldError[];
  /** A failure that belongs to no field. */
  failure: string | null;
  clash: FormClash<Fields> | null;
  /** Ends a clash: ours is sent over theirs, or theirs is shown. */
  settle: (keep: "ours" | "theirs") => void;
  busy: boolean;
  submit: (event: FormEvent<HTMLFormElement>) => void;
}

/** A field whose entry could not even be read keeps its own sentence; the form waits for it. */
function unreadable(form: HTMLFormElement, refused: readonly string[]): HTMLElement | undefined {
  const wrong = [...form.querySelectorAll<HTMLElement>("[aria-invalid=true]")];
  return wrong.find(({ id }) => !refused.includes(id));
}

/**
 * The state of a form whose server answers with the path of each wrong field. Nothing typed is ever cleared.
 * `save` gets the version to name: the first one, or the one of a clash that was settled.
 */
export function useForm<Fields extends object>(
  first: Fields,
  firstVersion: number,
  save: (fields: Fields, version: number) => Promise<void>,
): Form<Fields> {
  const own = useId();
  const [fields, setFields] = useState(first);
  const [version, setVersion] = useState(firstVersion);
  const [faults, setFaults] = useState<readonly FieldError[]>([]);
  const [failure, setFailure] = useState<string | null>(null);
  const [clash, setClash] = useState<FormClash<Fields> | null>(null);
  const [busy, setBusy] = useState(false);

  async function send(seen: number): Promise<void> {
    setBusy(true);
    setFaults([]);
    setFailure(null);
    try {
      await save(fields, seen);
    } catch (error) {
      if (!(error instanceof CallFailed)) throw error;
      const { code, errors, title, detail, current } = error.problem;
      if (code === "changed-meanwhile") setClash(current as FormClash<Fields>);
      else if (errors) setFaults(errors);
      else setFailure(`${title} ${detail}`);
    } finally {
      setBusy(false);
    }
  }

  return {
    fields,
    faults,
    failure,
    clash,
    busy,
    set: (change) => setFields((before) => ({ ...before, ...change })),
    words: (path) => ({ id: `${own}-${path}`, wrong: faults.find(({ at }) => at === path)?.message }),
    settle(keep) {
      if (!clash) return;
      setClash(null);
      setVersion(clash.version);
      if (keep === "ours") void send(clash.version);
      else {
        const names = Object.keys(first) as (keyof Fields)[];
        setFields((before) =>
          Object.assign({ ...before }, ...names.map((name) => ({ [name]: clash[name] }))),
        );
      }
    },
    submit(event) {
      event.preventDefault();
      const refused = faults.map(({ at }) => `${own}-${at}`);
      const waits = unreadable(event.currentTarget, refused);
      if (waits) waits.focus();
      else if (!busy) void send(version);
    },
  };
}
