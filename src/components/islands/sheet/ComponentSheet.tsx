import { ButtonSheet } from "./ButtonSheet.tsx";
import { ChoiceSheet, FieldSheet } from "./FieldSheet.tsx";
import { MessageSheet } from "./MessageSheet.tsx";
import { SignSheet } from "./SignSheet.tsx";

/** All generic components with their states: for the development page only. */
export default function ComponentSheet() {
  return (
    <div className="flex flex-col gap-11">
      <ButtonSheet />
      <FieldSheet />
      <ChoiceSheet />
      <SignSheet />
      <MessageSheet />
    </div>
  );
}
