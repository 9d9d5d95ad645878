import type { Question } from "#src/partslist/draft.ts";
import type { Edit, ImportView } from "./use-import.ts";

function answerOf(question: Question, edit: Edit): string | null {
  const given = edit.answers?.find(({ row, code }) => row === question.row && code === question.code);
  if (given) return given.choice;
  if (edit.takeSuggestions && question.answer === null) return question.suggested.choice;
  const opened = edit.reopen?.some(({ row, code }) => row === question.row && code === question.code);
  return opened ? null : question.answer;
}

/**
 * The view with an edit's answers in it, before the server has read the rows anew: questions move between open and
 * settled, and their counts follow. What the answers do to the lines only the reply tells.
 */
export function answeredAtOnce<View extends ImportView>(view: View, edit: Edit): View {
  const { questions } = view;
  const all = [...questions.open, ...questions.settled].map((question) => ({
    ...question,
    answer: answerOf(question, edit),
  }));
  const open = all.filter(({ answer }) => answer === null);
  const unseen = questions.must + questions.look - questions.open.length;
  const must = open.filter(({ level }) => level === "must");
  const look = open.filter(({ level }) => level === "look");
  const left = edit.takeSuggestions ? 0 : unseen;
  const mustUnseen = Math.max(
    0,
    questions.must - questions.open.filter(({ level }) => level === "must").length,
  );
  const settled = all.filter(({ answer }) => answer !== null);
  return {
    ...view,
    questions: {
      open: [...must, ...look],
      must: must.length + Math.min(left, mustUnseen),
      look: look.length + Math.max(0, left - mustUnseen),
      settled,
      settledCount: questions.settledCount + settled.length - questions.settled.length,
    },
  };
}
