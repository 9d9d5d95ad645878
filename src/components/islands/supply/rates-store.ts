import { useQuery } from "@tanstack/react-query";
import { call, sendFile } from "#src/components/islands/call.ts";
import { pageCache, queryClient } from "#src/components/islands/query-client.ts";
import type { DELETE, PUT } from "#src/pages/api/workshops/[workshop]/currency-rates/[currency].ts";
import type { POST as FETCH } from "#src/pages/api/workshops/[workshop]/currency-rates/fetch.ts";
import type { POST as FILE } from "#src/pages/api/workshops/[workshop]/currency-rates/file.ts";
import type { GET } from "#src/pages/api/workshops/[workshop]/currency-rates.ts";
import type { RateView } from "#src/server/currency-rate-changes.ts";
import type { RatesTaken } from "#src/server/take-reference-rates.ts";
import type { CurrencyRateInput } from "#src/shapes/currency-rate.ts";
import { figuresChanged, supplyKeys } from "./supply-keys.ts";

function api(workshop: string, rest = ""): string {
  return `/api/workshops/${workshop}/currency-rates${rest}`;
}

function hold(workshop: string, how: (rows: readonly RateView[]) => RateView[]): void {
  queryClient.setQueryData<RateView[]>(supplyKeys.rates(workshop), (rows) => rows && how(rows));
  figuresChanged();
}

/** The rates as this screen has them; `first` came with the page. */
export function useRates(workshop: string, first: RateView[]): RateView[] {
  const { data } = useQuery(
    {
      queryKey: supplyKeys.rates(workshop),
      queryFn: () => call<typeof GET>("GET", api(workshop)),
      initialData: first,
    },
    pageCache(),
  );
  return data;
}

function isSame(a: RateView, b: RateView): boolean {
  return a.currency === b.currency && a.dated === b.dated;
}

/** Sets the rate of a day. @throws CallFailed */
export async function setRate(workshop: string, currency: string, input: CurrencyRateInput): Promise<void> {
  const saved = await call<typeof PUT>("PUT", api(workshop, `/${currency}`), input);
  hold(workshop, (rows) =>
    [...rows.filter((row) => !isSame(row, saved)), saved].sort(
      (a, b) => a.currency.localeCompare(b.currency) || b.dated.localeCompare(a.dated),
    ),
  );
}

/** Removes the rate of a day. @throws CallFailed */
export async function removeRate(workshop: string, rate: RateView): Promise<void> {
  const { currency, dated, version } = rate;
  await call<typeof DELETE>("DELETE", api(workshop, `/${currency}?dated=${dated}&version=${version}`));
  hold(workshop, (rows) => rows.filter((row) => !isSame(row, rate)));
}

async function readAgain(workshop: string): Promise<void> {
  const rows = await call<typeof GET>("GET", api(workshop));
  hold(workshop, () => rows);
}

/** Takes a file of reference rates. @throws CallFailed */
export async function takeRatesFile(workshop: string, file: File): Promise<RatesTaken> {
  const taken = await sendFile<typeof FILE>(api(workshop, "/file"), file, file.name);
  await readAgain(workshop);
  return taken;
}

/** Takes the reference rates from the address in the settings. @throws CallFailed */
export async function fetchRates(workshop: string): Promise<RatesTaken> {
  const taken = await call<typeof FETCH>("POST", api(workshop, "/fetch"));
  await readAgain(workshop);
  return taken;
}
