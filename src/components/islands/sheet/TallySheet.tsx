import { useState } from "react";
import { methodLinks } from "#src/components/method-links.ts";
import type { Paper } from "#src/components/working-paper.ts";
import { Button } from "../parts/Button.tsx";
import { type TallyCell, TallyStrip } from "../parts/TallyStrip.tsx";
import { WorkingPanel } from "../parts/WorkingPanel.tsx";

const PAPER: Paper = {
  of: "Cost per kit at a run of 120",
  basis: "In euro, without VAT",
  lines: [
    { letter: "a", label: "Parts, 23 lines", amount: "455.25", source: { label: "Parts", href: "#parts" } },
    {
      letter: "b",
      label: "Boards, 10 panels of 12",
      sign: "+",
      amount: "270.50",
      source: { label: "Boards", href: "#boards" },
    },
    {
      letter: "c",
      label: "Booklet, box and bags",
      sign: "+",
      amount: "269.60",
      source: { label: "Parts", href: "#parts" },
    },
    {
      letter: "d",
      label: "Postage, 5 parcels",
      sign: "+",
      amount: "29.30",
      source: { label: "Offers", href: "#offers" },
    },
    {
      letter: "e",
      label: "Once-only costs",
      sign: "+",
      amount: "769.00",
      source: { label: "Run", href: "#run" },
      subs: [
        { label: "Safety and EMC check", amount: "285.00" },
        { label: "Prototypes, rev A to C", amount: "192.00" },
        { label: "Booklet and photographs", amount: "150.00" },
        { label: "Test jig", amount: "84.00" },
        { label: "Board tooling", amount: "58.00" },
      ],
    },
    { letter: "f", label: "Spent on the run", sign: "=", amount: "1\u00a0793.65" },
    {
      letter: "g",
      label: "Kits in the run",
      sign: "÷",
      amount: "120",
      source: { label: "Run", href: "#run" },
    },
    { letter: "h", label: "Cost per kit", sign: "=", amount: "14.95", result: true },
  ],
  notes: ["f ÷ g is 14.9471, written to the nearest cent."],
  methods: methodLinks(["8"]),
  foot: "Worked at 14:32 from rev C and the prices of 9 March.",
};

function cells(known: boolean, open: boolean, onOpen: () => void): TallyCell[] {
  const none = (key: string, label: string, needs: string, onPhone?: boolean): TallyCell => ({
    key,
    label,
    value: null,
    needs,
    onPhone,
  });
  if (!known)
    return [
      none("cost", "Cost per kit", "needs parts", true),
      none("price", "Price", "not set"),
      none("earns", "Earns per kit", "needs both", true),
      none("even", "Even after", "needs both"),
      none("cash", "Cash needed", "needs parts"),
    ];
  return [
    {
      key: "cost",
      label: "Cost per kit",
      value: "€14.95",
      change: { amount: "−€2.14", turn: "better" },
      onOpen,
      open,
      onPhone: true,
    },
    { key: "price", label: "Price", value: "€34.00", onOpen },
    {
      key: "earns",
      label: "Earns per kit",
      value: "€10.24",
      change: { amount: "+€2.14", turn: "better" },
      onOpen,
      onPhone: true,
    },
    {
      key: "even",
      label: "Even after",
      value: "72",
      after: "sold",
      change: { amount: "+4", turn: "worse" },
      onOpen,
    },
    {
      key: "cash",
      label: "Cash needed",
      value: "€1\u00a0793.65",
      change: { amount: "+€84.94", turn: "worse" },
      onOpen,
    },
  ];
}

/** The tally of the sheet with a working that opens, and switches for its other states. */
export default function TallySheet() {
  const [run, setRun] = useState(120);
  const [open, setOpen] = useState(false);
  const [known, setKnown] = useState(true);
  const [workingOut, setWorkingOut] = useState(false);
  return (
    <>
      <TallyStrip
        run={run}
        onRun={setRun}
        sweetSpots={[60, 120, 180, 240]}
        cells={cells(known, open, () => setOpen(true))}
        workingOut={workingOut}
        note={
          known
            ? {
                edit: "Run changed from 100 to 120.",
                text: "Signed figures show the change.",
                actions: [
                  { label: "Undo", run: () => setRun(100) },
                  { label: "Keep, and clear the signs", run: () => undefined },
                ],
              }
            : undefined
        }
      />
      {open && <WorkingPanel paper={PAPER} onClose={() => setOpen(false)} />}
      <div className="gutters flex flex-wrap gap-3 pt-6" data-screen-only>
        <Button size="small" onClick={() => setKnown(!known)}>
          {known ? "Show figures not known" : "Show figures known"}
        </Button>
        <Button size="small" onClick={() => setWorkingOut(!workingOut)}>
          {workingOut ? "Show figures worked out" : "Show figures being worked out"}
        </Button>
      </div>
    </>
  );
}
