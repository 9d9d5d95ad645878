import { useState } from "react";
import { buttonLook } from "#src/components/button-look.ts";
import { type KitAddress, kitApi } from "#src/components/islands/kit-address.ts";
import { DropArea } from "#src/components/islands/parts/DropArea.tsx";
import { Later } from "#src/components/islands/parts/Later.tsx";
import { laterPart } from "#src/components/islands/parts/later-part.ts";
import { Section } from "#src/components/islands/parts/Section.tsx";

const PlanFileFigures = laterPart<{ file: File }>(
  async () => (await import("./PlanFileFigures.tsx")).PlanFileFigures,
);

/** The plan as a file, and a file's figures worked out again without changing anything here. */
export function PlanFile({ address }: { address: KitAddress }) {
  const [file, setFile] = useState<File | null>(null);
  return (
    <Section id="plan-file" title="The plan as a file" aside="for scripts, for keeping, for another machine">
      <p className="type-note measure-prose">
        The file holds everything the figures rest on, as JSON. Any plan can be worked out again here or at{" "}
        <code>POST /api/costing</code>; nothing of this kit changes.{" "}
        <a href="/api/openapi.json">Description of the API</a>
      </p>
      <p className="mt-3">
        <a href={`${kitApi(address, "/plan")}?download=1`} download className={buttonLook()}>
          Download this plan
        </a>
      </p>
      <div className="mt-5">
        <DropArea
          title="Work out a plan file"
          level={3}
          accept=".json,application/json"
          chooseLabel="Choose a plan file"
          onFile={setFile}
        >
          Drop a file that was downloaded here. Its figures stand below; nothing is saved.
        </DropArea>
      </div>
      <div aria-live="polite" className="mt-4">
        {file && <Later part={PlanFileFigures} give={{ file }} what="The figures of the file" />}
      </div>
    </Section>
  );
}
