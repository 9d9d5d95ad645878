import { useEffect } from "react";
import type { KitAddress } from "#src/components/islands/kit-address.ts";
import { Later } from "#src/components/islands/parts/Later.tsx";
import { laterPart } from "#src/components/islands/parts/later-part.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { useStore } from "./module-store.ts";
import { type OpenWorking, openWorking } from "./open-working.ts";

const OVERLAY =
  "fixed right-0 bottom-0 z-30 h-[70vh] w-[min(588px,100vw)] border-t-2 border-l-2 border-ink bg-paper p-6";

const OpenPanel = laterPart<{ address: KitAddress; plan: Plan; open: OpenWorking }>(
  async () => (await import("./OpenPanel.tsx")).OpenPanel,
);

/** Whatever opens a working says so in its name, wherever on the page it is drawn. */
const OPENERS = 'button[aria-label$="show the working"]';

function fetchSoon({ target }: Event): void {
  if (target instanceof Element && target.closest(OPENERS)) OpenPanel.preload();
}

/** Shows the working of whichever figure of the page is open; it follows edits. One per page. */
export function WorkingHost({ address, plan }: { address: KitAddress; plan: Plan | undefined }) {
  const open = useStore(openWorking, null);
  useEffect(() => {
    addEventListener("pointerover", fetchSoon);
    addEventListener("focusin", fetchSoon);
    return () => {
      removeEventListener("pointerover", fetchSoon);
      removeEventListener("focusin", fetchSoon);
    };
  }, []);
  if (!open || !plan) return null;
  return (
    <Later part={OpenPanel} give={{ address, plan, open }} what="The working" rows={9} frame={OVERLAY} />
  );
}
