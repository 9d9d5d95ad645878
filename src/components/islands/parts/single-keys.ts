/** Keys of a single letter or sign can get in the way of speech input (WCAG 2.1.4): they can be turned off. */
const STORED = "single-keys";

export type KeyStore = Pick<Storage, "getItem" | "setItem">;

export function singleKeysOn(store: KeyStore): boolean {
  return store.getItem(STORED) !== "off";
}

export function setSingleKeys(store: KeyStore, on: boolean): void {
  store.setItem(STORED, on ? "on" : "off");
}

/** Whether a press asks for the list of keys: a question mark outside a field, or with Alt anywhere. */
export function opensKeys(press: KeyboardEvent, store: KeyStore): boolean {
  if (press.key !== "?" || press.ctrlKey || press.metaKey || press.defaultPrevented) return false;
  if (press.altKey) return true;
  const { target } = press;
  const typing =
    target instanceof HTMLElement && target.closest("input, textarea, select, [contenteditable]") !== null;
  return !typing && singleKeysOn(store);
}
