import type { ReactNode } from "react";

export type QuestionProps = {
  question: string /** The answer; deciding figures in `<b>`. */;
  children: ReactNode;
  actions?: ReactNode;
};

/** The head of a page, as `Question.astro`, for answers that change while one works. */
export function Question({ question, children, actions }: QuestionProps) {
  return (
    <div className="mb-8 flex flex-wrap items-end justify-between gap-x-8 gap-y-4">
      <div className="min-w-0">
        {/* As the script of the document layout leaves it, which runs before the page is brought to life. */}
        <h1 tabIndex={-1} className="type-h1">
          {question}
        </h1>
        <p className="type-answer mt-1.5">{children}</p>
      </div>
      {actions && <div className="flex flex-wrap gap-3 print:hidden">{actions}</div>}
    </div>
  );
}
