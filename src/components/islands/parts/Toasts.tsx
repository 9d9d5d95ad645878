import { useEffect, useState, useSyncExternalStore } from "react";
import { BadIcon, CautionIcon, DoneIcon } from "./Icons.tsx";
import { closeToast, onToasts, type Toast, type ToastKind, toastsNow } from "./toasts.ts";

const STAYS_MS = 6000;
const NONE: readonly Toast[] = [];

/** The toasts of the page, bottom left (above the tally on a phone). One stands in the document layout. */
export default function Toasts() {
  const toasts = useSyncExternalStore(onToasts, toastsNow, () => NONE);
  return (
    <section
      aria-label="Messages"
      data-screen-only
      className="fixed bottom-[116px] left-4 z-40 flex max-w-[calc(100vw-2rem)] flex-col gap-2 tablet:bottom-8 tablet:left-12 tablet:max-w-[520px]"
    >
      <div role="status" className="flex flex-col gap-2">
        {toasts.map((toast) => (
          <ToastSlab key={toast.id} toast={toast} />
        ))}
      </div>
    </section>
  );
}

/** One slab: its own time runs out unless it is hovered, holds focus, or is a fault. */
export function ToastSlab({ toast }: { toast: Toast }) {
  const [held, setHeld] = useState(false);
  const stays = toast.kind === "fault" || held;
  useEffect(() => {
    if (stays) return;
    const timer = setTimeout(() => closeToast(toast.id), STAYS_MS);
    return () => clearTimeout(timer);
  }, [stays, toast.id]);

  return (
    // biome-ignore lint/a11y/noStaticElementInteractions: the pointer only holds the message; nothing is done by it.
    <div
      role={toast.kind === "fault" ? "alert" : undefined}
      className="flex animate-menu items-center gap-4 self-start rounded-control bg-ink px-[18px] py-[11px] text-paper type-note"
      onPointerEnter={() => setHeld(true)}
      onPointerLeave={() => setHeld(false)}
      onFocus={() => setHeld(true)}
      onBlur={() => setHeld(false)}
    >
      <ToastIcon kind={toast.kind} />
      <span className="tablet:max-w-[320px]">{toast.text}</span>
      {toast.action && (
        <ToastButton
          label={toast.action.label}
          onClick={() => {
            toast.action?.run();
            closeToast(toast.id);
          }}
        />
      )}
      {toast.kind === "fault" && <ToastButton label="Close" onClick={() => closeToast(toast.id)} />}
    </div>
  );
}

function ToastButton({ label, onClick }: { label: string; onClick: () => void }) {
  return (
    <button
      type="button"
      onClick={onClick}
      className="min-h-6 shrink-0 font-semibold underline decoration-[1.5px] underline-offset-4 focus-visible:outline-paper"
    >
      {label}
    </button>
  );
}

function ToastIcon({ kind }: { kind: ToastKind }) {
  if (kind === "fault")
    return <BadIcon className="size-[18px] shrink-0 text-bad-on-ink [--cut:var(--color-ink)]" />;
  if (kind === "caution")
    return <CautionIcon className="size-[18px] shrink-0 text-caution-on-ink [--cut:var(--color-ink)]" />;
  if (kind === "good")
    return <DoneIcon className="size-[18px] shrink-0 text-good-on-ink [--cut:var(--color-ink)]" />;
  return null;
}
