import { useCallback, useRef } from "react";
import { axisMoneyText } from "#src/components/amount-text.ts";

/** The same array as long as it holds the same values: a chart compares by identity what it is given. */
export function useStable<T>(values: readonly T[]): T[] {
  const held = useRef<T[]>([]);
  const same =
    values.length === held.current.length &&
    values.every((value, place) => Object.is(value, held.current[place]));
  if (!same) held.current = [...values];
  return held.current;
}

/** How the figures of a money axis are written; the same function as long as its ticks are the same. */
export function useAxisMoney(ticks: readonly number[], currency: string): (value: number) => string {
  return useCallback((value: number) => axisMoneyText(value, ticks, currency), [ticks, currency]);
}
