import type { ReactNode } from "react";
import {
  Capacitor,
  Diode,
  DipChip,
  Electrolytic,
  Led,
  ScrewTerminal,
  SlideSwitch,
  Transistor,
  Trimmer,
} from "#src/components/islands/parts/PartDrawings.tsx";
import type { OfferPart } from "#src/server/kit-offers.ts";

/** A drawing and the box it fills, in millimetres. */
type Picture = { box: string; drawing: ReactNode };

const PICTURES: Partial<Record<OfferPart["class"], Picture>> = {
  led: { box: "-6 -1 12 24", drawing: <Led /> },
  capacitor: { box: "-7 -1 14 20", drawing: <Capacitor marking="" /> },
  diode: { box: "-16 -8 32 16", drawing: <Diode /> },
  transistor: { box: "-6 -2 12 22", drawing: <Transistor /> },
  "integrated-circuit": { box: "-11 -7 22 14", drawing: <DipChip marking="" /> },
  potentiometer: { box: "-7 -7 14 14", drawing: <Trimmer /> },
  switch: { box: "-8 -6 16 14", drawing: <SlideSwitch /> },
  connector: { box: "-8 -8 16 18", drawing: <ScrewTerminal /> },
};

const ELECTROLYTIC: Picture = { box: "-6 -1 12 28", drawing: <Electrolytic /> };

/** Farads from which a capacitor is drawn as a can. */
const CAN_FROM = 1e-6;

/** The kind of part, drawn small; nothing where there is no drawing. */
export function PartPicture({ part }: { part: Pick<OfferPart, "class" | "value"> }) {
  const can = part.class === "capacitor" && part.value !== null && Number(part.value) >= CAN_FROM;
  const picture = can ? ELECTROLYTIC : PICTURES[part.class];
  if (!picture) return null;
  return (
    <svg viewBox={picture.box} className="h-10 w-7 shrink-0" aria-hidden="true" data-real-object>
      {picture.drawing}
    </svg>
  );
}
