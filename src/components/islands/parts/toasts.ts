/**
 * What is waiting to be shown as a toast. A module's own store: every island of a page shares it, so any of them can
 * call `showToast` and the one `Toasts` island of the document shows it.
 */
export type ToastKind = "note" | "good" | "caution" | "fault";

export type ToastAction = { label: string; run: () => void };

export type Toast = { id: number; kind: ToastKind; text: string; action?: ToastAction };

/** At most two stand at once; the oldest that is no fault makes room. */
const MOST = 2;

let shown: readonly Toast[] = [];
let lastId = 0;
const listeners = new Set<() => void>();

function put(toasts: readonly Toast[]): void {
  shown = toasts;
  for (const listener of listeners) listener();
}

function makeRoom(toasts: readonly Toast[]): readonly Toast[] {
  if (toasts.length < MOST) return toasts;
  const leaves = toasts.find((toast) => toast.kind !== "fault") ?? toasts[0];
  return toasts.filter((toast) => toast !== leaves);
}

/** Shows a toast: a note for 6 seconds, a fault until it is closed. Returns its id. */
export function showToast(toast: { text: string; kind?: ToastKind; action?: ToastAction }): number {
  lastId += 1;
  put([...makeRoom(shown), { kind: "note", ...toast, id: lastId }]);
  return lastId;
}

export function closeToast(id: number): void {
  put(shown.filter((toast) => toast.id !== id));
}

export function toastsNow(): readonly Toast[] {
  return shown;
}

/** Calls back after every change; returns the way to stop. */
export function onToasts(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}
