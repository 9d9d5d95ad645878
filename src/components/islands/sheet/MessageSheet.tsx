import { useState } from "react";
import { Banner } from "../parts/Banner.tsx";
import { Button } from "../parts/Button.tsx";
import { ConflictBox } from "../parts/ConflictBox.tsx";
import { Dialog } from "../parts/Dialog.tsx";
import { DrawersPicture } from "../parts/DrawersPicture.tsx";
import { DropArea } from "../parts/DropArea.tsx";
import { ErrorBox } from "../parts/ErrorBox.tsx";
import { QuietButton } from "../parts/QuietButton.tsx";
import { Section } from "../parts/Section.tsx";
import { RepairList, SettleList } from "../parts/SettleList.tsx";
import { showToast } from "../parts/toasts.ts";

const nothing = () => undefined;

/** Toasts, dialog, faults, a clash, what waits, and the drop area. */
export function MessageSheet() {
  const [asking, setAsking] = useState(false);
  const close = () => setAsking(false);
  return (
    <>
      <div className="grid gap-x-14 gap-y-11 desktop:grid-cols-2">
        <Section title="Toast">
          <div className="flex flex-wrap gap-3">
            <Button
              onClick={() =>
                showToast({
                  text: "Line 14 now buys 1\u00a0000 LEDs.",
                  action: { label: "Undo", run: nothing },
                })
              }
            >
              Show a note
            </Button>
            <Button
              onClick={() =>
                showToast({
                  kind: "fault",
                  text: "Nordhafen did not answer. Its prices of 7 March are used.",
                  action: { label: "Try again", run: nothing },
                })
              }
            >
              Show a fault
            </Button>
          </div>
        </Section>
        <Section title="Dialog">
          <Button kind="refuse" onClick={() => setAsking(true)}>
            Take Tom off
          </Button>
          <Dialog
            open={asking}
            title="Take Tom off this kit?"
            safe={{ label: "Keep Tom", run: close }}
            act={{ label: "Take Tom off", run: close, removes: true }}
          >
            He will no longer see Dew Lantern or set its price. What he has set stays.
          </Dialog>
        </Section>
        <Section title="Clash">
          <ConflictBox
            happened="Tom changed this price at 14:40."
            yours="€33.00"
            theirs="€34.00"
            theirWord="His"
            onKeepYours={nothing}
            onTakeTheirs={nothing}
          />
        </Section>
        <Section title="What waits">
          <SettleList
            label="Waiting for you"
            items={[
              {
                key: "j1",
                kind: "caution",
                over: "Dew Lantern",
                text: <a href="#j1">J1 arrives after the boards. Pick another offer or wait.</a>,
              },
              {
                key: "c3",
                kind: "waiting",
                over: "Dew Lantern",
                text: <a href="#c3">Ruth has C3's substitute to check.</a>,
              },
              {
                key: "spare",
                kind: "caution",
                text: "No spare board in 120.",
                actions: (
                  <>
                    <Button size="small">Add 2 spares</Button>
                    <Button size="small">Accept none</Button>
                  </>
                ),
              },
            ]}
          />
        </Section>
      </div>
      <Section title="Rows to settle" aside="2 must be settled, 4 are worth a look">
        <RepairList
          label="Rows to settle"
          items={[
            {
              key: "15",
              kind: "bad",
              row: "Row 15",
              what: "LED1-LED6",
              wrong: "The quantity says 5. The designators count 6.",
              suggestion: <Button size="row">Use 6, as the designators say</Button>,
              other: <QuietButton>Keep 5</QuietButton>,
            },
            {
              key: "9",
              kind: "caution",
              row: "Row 9",
              what: "C1, C2",
              wrong: "“100n” has no unit.",
              suggestion: <Button size="row">Read it as 100 nF</Button>,
              other: <QuietButton>Leave as text</QuietButton>,
            },
          ]}
        />
      </Section>
      <Banner
        lead="Not saved since 14:41: no connection."
        action={<Button size="small">Try again now</Button>}
      >
        Your changes are kept on this computer and will be sent when it is back.
      </Banner>
      <ErrorBox
        title="Two prices are missing at 260"
        causes={[
          {
            key: "21",
            place: "Line 21",
            what: "BT1",
            reason: "Lumenhof’s price from 250 up ended on 28 February.",
            detail: "An ended price is never used without your word.",
            ways: (
              <>
                <Button size="small">Ask for a new price</Button>
                <QuietButton>Use €0.58, and mark it old</QuietButton>
              </>
            ),
          },
          {
            key: "23",
            place: "Line 23",
            what: "X1",
            reason: "Ashgrove gives no price above 250.",
            detail: "Its laser bed holds 250 discs; the next may be dearer.",
            ways: (
              <>
                <Button size="small">Ask the price</Button>
                <QuietButton>Use €0.41, and mark it guessed</QuietButton>
              </>
            ),
          },
        ]}
      />
      <DropArea
        title="Drop a parts list here"
        accept=".csv,.tsv"
        onFile={nothing}
        onPaste={nothing}
        picture={<DrawersPicture kits={50} />}
      >
        A bill of materials from your drawing program, or a spreadsheet. Any columns in any order; you say
        what each means. CSV, TSV, XLSX or ODS, to {"5\u00a0MB and 20\u00a0000 rows"}.
      </DropArea>
    </>
  );
}
