import { Bands, RunBands } from "../parts/Bands.tsx";
import { Change } from "../parts/Change.tsx";
import { Chip } from "../parts/Chip.tsx";
import { Figure } from "../parts/Figure.tsx";
import { LoadingLines } from "../parts/Loading.tsx";
import { Pad } from "../parts/Pad.tsx";
import { Busy, Progress } from "../parts/Progress.tsx";
import { Section } from "../parts/Section.tsx";
import { State } from "./State.tsx";

const RUNS = [10, 24, 36, 47, 50, 75, 96, 100, 120, 125, 144, 180, 250, 365, 500];
const nothing = () => undefined;

/** Pads, bands, chips, changes, figures, progress and loading. */
export function SignSheet() {
  return (
    <>
      <Section title="The trail">
        <div className="flex flex-wrap gap-x-8 gap-y-4">
          <State name="done">
            <Pad state="done" number={1} />
          </State>
          <State name="to settle">
            <Pad state="to-settle" number={2} />
          </State>
          <State name="not started">
            <Pad state="not-started" number={8} />
          </State>
          <State name="you are here">
            <Pad state="done" here number={5} />
          </State>
        </div>
      </Section>
      <Section
        title="Bands for run sizes"
        aside="two figures and a multiplier when exact, else three figures and a multiplier"
      >
        <ul className="grid grid-cols-2 gap-4 tablet:grid-cols-5">
          {RUNS.map((kits) => (
            <li key={kits} className="flex items-center gap-3 font-semibold">
              <RunBands kits={kits} /> {kits}
            </li>
          ))}
        </ul>
        <div className="mt-5 flex flex-wrap items-center gap-6">
          <Bands colours={["brown", "black", "orange", "gold"]} tolerance width={206} /> 10 kΩ, 5 %
          <RunBands kits={120} width={104} /> <RunBands kits={120} width={64} />{" "}
          <RunBands kits={120} width={52} />
        </div>
      </Section>
      <div className="grid gap-x-14 gap-y-11 desktop:grid-cols-2">
        <Section title="Verdicts and states">
          <div className="flex flex-wrap gap-6">
            <Chip kind="good">Fits</Chip>
            <Chip kind="caution">With care</Chip>
            <Chip kind="bad">Does not fit</Chip>
            <Chip kind="waiting">Waits for Ruth</Chip>
            <Chip kind="plain">Settled</Chip>
          </div>
        </Section>
        <Section title="Signed changes, figures">
          <div className="flex flex-wrap items-center gap-6">
            <Change amount="−€2.14" turn="better" />
            <Change amount="+€84.94" turn="worse" />
            <Change amount="+€1.00" turn="neither" />
            <Figure label="Left with about" value="€881" onOpen={nothing} />
            <Figure label="Cost per kit" value="€14.95" onOpen={nothing} open className="type-tally" />
            <Figure label="Likely sold" value="106" />
          </div>
        </Section>
        <Section title="Progress">
          <Progress done={16} of={26} what="rows read" />
          <div className="mt-4">
            <Busy verb="Working out" />
          </div>
        </Section>
        <Section title="Loading">
          <div className="max-w-[420px]">
            <LoadingLines />
          </div>
        </Section>
      </div>
    </>
  );
}
