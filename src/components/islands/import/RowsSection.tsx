import { useEffect, useRef, useState } from "react";
import type { Answer, Question } from "#src/partslist/draft.ts";
import { choiceLabel, questionSentence } from "#src/partslist/questions.ts";
import type { QuestionsView } from "#src/server/bring-in/view.ts";
import { Button } from "../parts/Button.tsx";
import { QuietButton } from "../parts/QuietButton.tsx";
import { Section } from "../parts/Section.tsx";
import { type RepairItem, RepairList } from "../parts/SettleList.tsx";
import { counted, numberWord } from "./count-words.ts";
import { Folded } from "./Folded.tsx";
import { OtherChoices } from "./OtherChoices.tsx";
import type { Edit } from "./use-import.ts";

interface Props {
  questions: QuestionsView;
  /** Parts to choose from, on a price list. */
  parts?: readonly { id: string; name: string }[];
  edit: (edit: Edit) => void;
}

function aside({ must, look }: QuestionsView): string {
  if (must + look === 0) return "nothing is left to settle";
  const looks = look === 1 ? "1 is worth a look" : `${look} are worth a look`;
  if (must === 0) return looks;
  return `${must} must be settled${look > 0 ? `, ${looks}` : ""}`;
}

/** Rows with a question, worst first, each with a suggested repair. Answering moves on to the next. */
export function RowsSection({ questions, parts, edit }: Props) {
  const box = useRef<HTMLDivElement>(null);
  const next = useRef<number | null>(null);
  const open = questions.must + questions.look;

  useEffect(() => {
    if (next.current === null) return;
    const suggestions = box.current?.querySelectorAll<HTMLElement>("[data-suggestion]");
    const at = Math.min(next.current, (suggestions?.length ?? 0) - 1);
    (suggestions?.[at] ?? box.current?.querySelector<HTMLElement>("[data-settled]"))?.focus();
    next.current = null;
  });

  const answer = (place: number, given: Answer) => {
    next.current = place;
    edit({ answers: [given] });
  };
  const takeAll = () => {
    next.current = 0;
    edit({ takeSuggestions: true });
  };
  return (
    <Section
      id="rows"
      title="Rows to settle"
      aside={aside(questions)}
      actions={
        open > 1 && (
          <Button size="small" onClick={takeAll}>
            Take all {numberWord(open)} suggestions
          </Button>
        )
      }
    >
      <div ref={box}>
        <RepairList
          label="Rows to settle"
          items={questions.open.map((question, place) => repair(question, place, parts, answer))}
        />
        {open > questions.open.length && (
          <p className="mt-2 text-ink-2">
            {counted(open - questions.open.length, "row more follows", "rows more follow")} as these are
            settled.
          </p>
        )}
        {open === 0 && (
          <p data-settled tabIndex={-1} className="outline-none">
            Every row is a line, or is skipped for a reason given below.
          </p>
        )}
        <Settled questions={questions} edit={edit} />
      </div>
    </Section>
  );
}

function repair(
  question: Question,
  place: number,
  parts: Props["parts"],
  answer: (place: number, given: Answer) => void,
): RepairItem {
  const { row, code, suggested } = question;
  const choose = (choice: string, typed?: string) => answer(place, { row, code, choice, typed });
  return {
    key: `${row} ${code}`,
    kind: question.level === "must" ? "bad" : "caution",
    row: `Row ${row}`,
    what: question.subject,
    wrong: questionSentence(question),
    suggestion: (
      <Button data-suggestion size="row" onClick={() => choose(suggested.choice)}>
        {choiceLabel(code, suggested)}
      </Button>
    ),
    other: <OtherChoices question={question} parts={parts} onChoose={choose} />,
  };
}

function Settled({ questions, edit }: Pick<Props, "questions" | "edit">) {
  if (questions.settledCount === 0) return null;
  return (
    <Folded summary={counted(questions.settledCount, "row is settled", "rows are settled")}>
      <ul className="type-table flex flex-col gap-2">
        {questions.settled.map((question) => (
          <SettledRow key={`${question.row} ${question.code}`} question={question} edit={edit} />
        ))}
      </ul>
    </Folded>
  );
}

function SettledRow({ question, edit }: { question: Question; edit: Props["edit"] }) {
  const { row, code, subject, answer, suggested, alternatives } = question;
  const [sent, setSent] = useState(false);
  const chosen = [suggested, ...alternatives].find(({ choice }) => choice === answer);
  return (
    <li className="flex flex-wrap gap-x-4">
      <span className="font-semibold">Row {row}</span>
      <span className="text-ink-2">{subject}</span>
      <span>{chosen ? choiceLabel(code, chosen) : answer}</span>
      <QuietButton
        disabled={sent}
        onClick={() => {
          setSent(true);
          edit({ reopen: [{ row, code }] });
        }}
      >
        Open it again<span className="heard-only">, row {row}</span>
      </QuietButton>
    </li>
  );
}
