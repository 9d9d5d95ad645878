import { FormFaults } from "#src/components/islands/forms/FormFaults.tsx";
import { useFirstFocus } from "#src/components/islands/forms/first-focus.ts";
import { type Form, useForm } from "#src/components/islands/forms/use-form.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { ChoiceField } from "#src/components/islands/parts/ChoiceField.tsx";
import { MeasureField } from "#src/components/islands/parts/MeasureField.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { TextField } from "#src/components/islands/parts/TextField.tsx";
import type { RailSides, Separation } from "#src/shapes/limits.ts";
import type { PanelTermsFields } from "#src/shapes/panel-terms.ts";
import { type PanelTermsDraft, termsFields } from "./panel-terms-draft.ts";

const SEPARATED: readonly { value: Separation; label: string }[] = [
  { value: "routed", label: "Routing and tabs" },
  { value: "v-score", label: "V-scoring" },
];

const RAILS: readonly { value: RailSides; label: string }[] = [
  { value: "long", label: "Along the long sides" },
  { value: "short", label: "Along the short sides" },
  { value: "all", label: "On all four sides" },
  { value: "none", label: "None" },
];

const ROW = "grid gap-x-6 gap-y-5 tablet:grid-cols-2 desktop:grid-cols-4";

export interface PanelTermsFormProps {
  first: PanelTermsDraft;
  version: number;
  action: string;
  onSave: (fields: PanelTermsFields, version: number) => Promise<void>;
  onLeave?: () => void;
}

/** What a board house makes panels like: the largest and the least, how boards are parted, and the rails. */
export function PanelTermsForm({ first, version, action, onSave, onLeave }: PanelTermsFormProps) {
  const form = useForm(first, version, (draft, seen) => onSave(termsFields(draft), seen));
  const box = useFirstFocus(true);
  return (
    <form ref={box} onSubmit={form.submit} noValidate className="flex flex-col gap-6">
      <FormFaults form={form} title="The panels are not saved" />
      <SizeFields form={form} />
      <PartingFields form={form} />
      <div className="flex flex-wrap items-center gap-5">
        <Button type="submit" busy={form.busy} busyWord="Saving">
          {action}
        </Button>
        {onLeave && <QuietButton onClick={onLeave}>Leave it</QuietButton>}
      </div>
    </form>
  );
}

function SizeFields({ form: { fields, set, words } }: { form: Form<PanelTermsDraft> }) {
  const length = (field: "largestWidth" | "largestHeight" | "leastWidth" | "leastHeight", label: string) => (
    <MeasureField
      label={label}
      {...words(field)}
      unit="mm"
      value={fields[field]}
      onMeasure={(value) => set({ [field]: value })}
    />
  );
  return (
    <>
      <TextField
        label="Board house"
        {...words("boardHouse")}
        autoComplete="off"
        hint="As its quotes name it: they share these panels."
        value={fields.boardHouse}
        onChange={(change) => set({ boardHouse: change.currentTarget.value })}
        className="max-w-[20rem]"
      />
      <div className={ROW}>
        {length("largestWidth", "Largest panel, one side")}
        {length("largestHeight", "Largest panel, other side")}
        {length("leastWidth", "Least panel, one side")}
        {length("leastHeight", "Least panel, other side")}
      </div>
    </>
  );
}

function PartingFields({ form: { fields, set, words } }: { form: Form<PanelTermsDraft> }) {
  return (
    <div className={ROW}>
      <ChoiceField
        label="Boards are parted by"
        {...words("separation")}
        choices={SEPARATED}
        value={fields.separation}
        onChange={(change) => set({ separation: change.currentTarget.value as Separation })}
      />
      {fields.separation === "routed" && (
        <MeasureField
          label="Gap the router leaves"
          {...words("gap")}
          unit="mm"
          value={fields.gap}
          onMeasure={(gap) => set({ gap })}
        />
      )}
      <ChoiceField
        label="Rails"
        {...words("railSides")}
        choices={RAILS}
        value={fields.railSides}
        onChange={(change) => set({ railSides: change.currentTarget.value as RailSides })}
      />
      {fields.railSides !== "none" && (
        <MeasureField
          label="Width of a rail"
          {...words("railWidth")}
          unit="mm"
          value={fields.railWidth}
          onMeasure={(railWidth) => set({ railWidth })}
        />
      )}
    </div>
  );
}
