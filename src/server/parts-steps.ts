import type { PartsChange } from "#src/shapes/parts-change.ts";
import { addLineStep, changeLineStep, moveLineStep, ownPartStep, removeLineStep } from "./line-steps.ts";
import { changePartStep, chooseStep } from "./part-steps.ts";
import type { PartsBatch, TakeStep } from "./parts-batch.ts";

const STEPS: { [Do in PartsChange["do"]]: TakeStep<Do> } = {
  "change-line": changeLineStep,
  "change-part": changePartStep,
  "own-part": ownPartStep,
  choose: chooseStep,
  "add-line": addLineStep,
  "remove-line": removeLineStep,
  "move-line": moveLineStep,
};

/** Takes one step. @throws Problem with paths inside the step. */
export function takeStep(batch: PartsBatch, step: PartsChange): void {
  (STEPS[step.do] as TakeStep<PartsChange["do"]>)(batch, step as never);
}
