import { useState } from "react";
import { CheckBox } from "../parts/CheckBox.tsx";
import { ChoiceField } from "../parts/ChoiceField.tsx";
import { FilterGroup } from "../parts/FilterGroup.tsx";
import { SearchIcon } from "../parts/Icons.tsx";
import { MeasureField } from "../parts/MeasureField.tsx";
import { MoneyField } from "../parts/MoneyField.tsx";
import { QuietButton } from "../parts/QuietButton.tsx";
import { RadioGroup } from "../parts/RadioGroup.tsx";
import { Section } from "../parts/Section.tsx";
import { Stepper } from "../parts/Stepper.tsx";
import { LongTextField, TextField } from "../parts/TextField.tsx";
import { State } from "./State.tsx";

const MEANINGS = [
  { value: "quantity", label: "Quantity" },
  { value: "value", label: "Value" },
  { value: "", label: "Leave out" },
];

/** Fields in every state, choices, and the stepper. */
export function FieldSheet() {
  const [price, setPrice] = useState("34.00");
  const [each, setEach] = useState("0.062");
  const [across, setAcross] = useState("8.0");
  return (
    <Section title="Fields">
      <div className="grid grid-cols-1 gap-x-7 gap-y-5 tablet:grid-cols-2 desktop:grid-cols-4">
        <TextField label="Rest" defaultValue="LH-5WW-30" />
        <TextField label="With a hint" defaultValue="LH-5WW-30" hint="As it stands on the bag." />
        <TextField label="Wrong" defaultValue="12o" wrong="A run is a number from 10 to 500." />
        <TextField label="Off" defaultValue="rev C" off hint="Set by the parts list." />
        <ChoiceField label="Choice" choices={MEANINGS} defaultValue="quantity" />
        <MoneyField label="Money" value={price} onMoney={setPrice} />
        <MoneyField label="Money, each" value={each} onMoney={setEach} places={4} unit="each" />
        <MeasureField label="Measure" value={across} onMeasure={setAcross} unit="mm" />
        <ChoiceField label="Choice, left out" choices={MEANINGS} defaultValue="" leaveOut="" />
        <TextField
          label="Find"
          labelHidden
          placeholder="Find a designator, value or code"
          sign={<SearchIcon />}
          type="search"
        />
        <TextField
          label="Password"
          type="password"
          defaultValue="workbench"
          inside={<QuietButton>Show</QuietButton>}
        />
        <LongTextField
          label="Note for the booklet"
          defaultValue="Bend C3's leads in to 2.5 mm before fitting."
        />
        <MoneyField label="Price on our own site, with VAT" value={price} onMoney={setPrice} large />
      </div>
    </Section>
  );
}

/** Check boxes, radios, a filter, and steppers in the middle and at an end. */
export function ChoiceSheet() {
  const [filter, setFilter] = useState("all");
  const [run, setRun] = useState(120);
  const [least, setLeast] = useState(10);
  return (
    <div className="grid gap-x-14 gap-y-11 desktop:grid-cols-2">
      <Section title="Choices">
        <div className="flex flex-wrap gap-x-8 gap-y-3">
          <CheckBox label="Labels" />
          <CheckBox label="Labels" defaultChecked />
          <RadioGroup
            legend="Paper"
            legendHidden
            inline
            defaultValue="a4"
            choices={[
              { value: "letter", label: "Letter" },
              { value: "a4", label: "A4" },
            ]}
          />
          <FilterGroup
            label="Lines"
            value={filter}
            onChoose={setFilter}
            choices={[
              { value: "all", label: "All", count: 23 },
              { value: "settle", label: "To settle", count: 3 },
            ]}
          />
        </div>
        <div className="mt-4 max-w-md">
          <RadioGroup
            legend="Would you buy one?"
            framed
            defaultValue="yes"
            choices={[
              { value: "yes", label: "Yes, at about €34", detail: "Write to me when I can buy it" },
              { value: "likely", label: "Quite likely", detail: "I want to see it finished first" },
            ]}
          />
        </div>
      </Section>
      <Section title="Stepper">
        <div className="flex flex-wrap gap-8">
          <State name="rest">
            <Stepper label="Run of" value={run} onStep={setRun} least={10} most={500} />
          </State>
          <State name="at the lower end">
            <Stepper label="How many?" labelHidden value={least} onStep={setLeast} least={10} most={500} />
          </State>
        </div>
      </Section>
    </div>
  );
}
