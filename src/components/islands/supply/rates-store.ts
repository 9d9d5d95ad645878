import { useQuery } from "@tanstack/react-query";
import { call } from "#src/components/islands/call.ts";
import { pageCache, queryClient } from "#src/components/islands/query-client.ts";
import type { DELETE, PUT } from "#src/pages/api/workshops/[workshop]/currency-rates/[currency].ts";
import type { GET } from "#src/pages/api/workshops/[workshop]/currency-rates.ts";
import type { RateView } from "#src/server/currency-rate-changes.ts";
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

/** Sets a rate. @throws CallFailed */
export async function setRate(workshop: string, currency: string, input: CurrencyRateInput): Promise<void> {
  const saved = await call<typeof PUT>("PUT", api(workshop, `/${currency}`), input);
  hold(workshop, (rows) =>
    [...rows.filter((row) => row.currency !== currency), saved].sort((a, b) =>
      a.currency.localeCompare(b.currency),
    ),
  );
}

/** Removes a rate. @throws CallFailed */
export async function removeRate(workshop: string, { currency, version }: RateView): Promise<void> {
  await call<typeof DELETE>("DELETE", api(workshop, `/${currency}?version=${version}`));
  hold(workshop, (rows) => rows.filter((row) => row.currency !== currency));
}
