import { useState } from "react";
import type { Question } from "#src/partslist/draft.ts";
import { choiceLabel } from "#src/partslist/questions.ts";
import { Button } from "../parts/Button.tsx";
import { ChoiceField } from "../parts/ChoiceField.tsx";
import { QuietButton } from "../parts/QuietButton.tsx";
import { TextField } from "../parts/TextField.tsx";

interface Props {
  question: Question;
  parts?: readonly { id: string; name: string }[];
  onChoose: (choice: string, typed?: string) => void;
}

/** What else can be done with a row, as quiet words; a quantity can be typed, a part named. */
export function OtherChoices({ question, parts, onChoose }: Props) {
  const { code, row, alternatives } = question;
  const [typing, setTyping] = useState(false);
  const named = code === "part-not-found" || code === "part-found-twice";
  if (typing) return <TypedQuantity row={row} onTyped={(text) => onChoose("type", text)} />;
  return (
    <span className="flex flex-wrap gap-x-4 gap-y-1">
      {alternatives.map((choice) => (
        <QuietButton
          key={choice.choice}
          className="text-left"
          onClick={() => (choice.choice === "type" ? setTyping(true) : onChoose(choice.choice))}
        >
          {choiceLabel(code, choice)}
          <span className="heard-only">, row {row}</span>
        </QuietButton>
      ))}
      {named && parts && parts.length > 0 && (
        <ChoiceField
          label={`The part of row ${row}`}
          labelHidden
          row
          value=""
          className="w-full"
          choices={[
            { value: "", label: "It is another part" },
            ...parts.map(({ id, name }) => ({ value: id, label: name })),
          ]}
          onChange={({ currentTarget }) =>
            currentTarget.value && onChoose(`take-part:${currentTarget.value}`)
          }
        />
      )}
    </span>
  );
}

function TypedQuantity({ row, onTyped }: { row: number; onTyped: (text: string) => void }) {
  const [text, setText] = useState("");
  const [wrong, setWrong] = useState<string>();
  return (
    <form
      className="flex items-start gap-2"
      onSubmit={(submit) => {
        submit.preventDefault();
        if (/^\d{1,5}$/.test(text.trim())) onTyped(text.trim());
        else setWrong("Write a whole number.");
      }}
    >
      <TextField
        label={`Quantity of row ${row}`}
        labelHidden
        row
        autoFocus
        inputMode="numeric"
        className="w-[110px]"
        value={text}
        wrong={wrong}
        onChange={({ currentTarget }) => setText(currentTarget.value)}
      />
      <Button type="submit" size="row">
        Use it
      </Button>
    </form>
  );
}
