import { clockTime } from "#src/components/clock-time.ts";
import { Banner } from "#src/components/islands/parts/Banner.tsx";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { useStore } from "./module-store.ts";
import { sendAll } from "./save-edits.ts";
import { NOTHING_SAVED, saving } from "./saving.ts";

/** The lost connection, while it is lost. */
export function LostConnection() {
  const { lostAt, waiting } = useStore(saving, NOTHING_SAVED);
  if (lostAt === null || waiting === 0) return null;
  return (
    <Banner
      lead={`Not saved since ${clockTime(lostAt)}: no connection.`}
      action={
        <Button size="small" onClick={sendAll}>
          Try again now
        </Button>
      }
    >
      Your changes are kept on this page and will be sent when it is back.
    </Banner>
  );
}
