import { useState } from "react";
import { Button } from "../parts/Button.tsx";
import { QuietButton } from "../parts/QuietButton.tsx";
import { Section } from "../parts/Section.tsx";
import { ShowWorking } from "../parts/ShowWorking.tsx";
import { State } from "./State.tsx";

const SHOWN_FOCUS = "outline-3 outline-offset-2 outline-petrol";

/** Buttons at rest, hover, focus, pressed, off, busy, and their quieter kin. */
export function ButtonSheet() {
  const [busy, setBusy] = useState(true);
  return (
    <Section title="Buttons">
      <div className="flex flex-wrap gap-x-8 gap-y-6">
        <State name="rest">
          <Button kind="primary">Choose 120</Button>
          <Button>Compare</Button>
        </State>
        <State name="hover">
          <Button kind="primary" className="border-petrol-hi bg-petrol-hi">
            Choose 120
          </Button>
          <Button className="bg-petrol-wash">Compare</Button>
        </State>
        <State name="focus">
          <Button kind="primary" className={SHOWN_FOCUS}>
            Choose 120
          </Button>
          <Button className={SHOWN_FOCUS}>Compare</Button>
        </State>
        <State name="pressed">
          <Button
            kind="primary"
            className="border-petrol-hi bg-petrol-hi [box-shadow:inset_0_3px_0_var(--color-outline)]"
          >
            Choose 120
          </Button>
          <Button className="bg-tint [box-shadow:inset_0_2px_0_var(--color-rule-2)]">Compare</Button>
        </State>
        <State name="off, with its reason">
          <Button kind="primary" offBecause="Settle rows 15 and 21 first.">
            Bring in 23 lines
          </Button>
        </State>
        <State name="busy, press to see it change">
          <Button kind="primary" busy={busy} busyWord="Working out">
            Choose 120
          </Button>
          <QuietButton onClick={() => setBusy(!busy)}>{busy ? "Stop" : "Start"}</QuietButton>
        </State>
        <State name="refusing">
          <Button kind="refuse">Refuse</Button>
        </State>
        <State name="quiet">
          <QuietButton>Keep 5</QuietButton>
        </State>
        <State name="show the working">
          <ShowWorking of="cost per kit" />
        </State>
        <State name="small, in a row">
          <Button size="small">Add a quote</Button>
          <Button size="row">Read it as 100 nF</Button>
        </State>
      </div>
    </Section>
  );
}
