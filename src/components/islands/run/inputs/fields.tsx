import { currencySign } from "#src/components/amount-text.ts";
import type { FieldWords } from "#src/components/islands/parts/Field.tsx";
import { MeasureField } from "#src/components/islands/parts/MeasureField.tsx";
import { MoneyField } from "#src/components/islands/parts/MoneyField.tsx";
import type { MoneyPlaces } from "#src/components/money-entry.ts";
import { fromPercent, toPercent } from "#src/components/percent.ts";
import { shownMoney } from "#src/components/shown-money.ts";
import { type Entry, take } from "./entry.ts";

type Common = FieldWords & {
  entry: Entry;
  off: boolean;
  row?: boolean;
  id?: string;
};

type AmountEntryProps = Common & {
  value: string | null;
  unit?: string;
  places?: MoneyPlaces;
  /** An empty field means "not known"; otherwise what stood there stays. */
  mayBeEmpty?: boolean;
};

/** An amount of money; the figures follow while one types. */
export function AmountEntry({ entry, value, mayBeEmpty, ...rest }: AmountEntryProps) {
  return (
    <MoneyField
      {...rest}
      live
      currency={currencySign(entry.currency)}
      value={shownMoney(value)}
      onMoney={(text) => (text === "" ? mayBeEmpty && take(entry, null) : take(entry, text))}
    />
  );
}

type RateEntryProps = Common & {
  /** A decimal: "0.029". */
  value: string | null;
  mayBeEmpty?: boolean;
  /** In hundredths: what is taken at most, and whether exactly that is allowed. */
  below?: number;
  most?: number;
  /** Why a rate, as a decimal, cannot be taken for what it would do. */
  refuse?: (rate: string) => string | undefined;
};

/** Rates keep six decimals, so hundredths four. */
const PERCENT = /^\d+(\.\d{1,4})?$/;

/** A rate or share, shown in hundredths. */
export function RateEntry({ entry, value, mayBeEmpty, below, most, refuse, ...rest }: RateEntryProps) {
  function wrong(percent: string): string | undefined {
    if (!PERCENT.test(percent)) return "Write at most four decimals.";
    if (below !== undefined && Number(percent) >= below) return `Write less than ${below} %.`;
    if (most !== undefined && Number(percent) > most) return `Write at most ${most} %.`;
    return refuse?.(fromPercent(percent));
  }
  return (
    <MeasureField
      {...rest}
      live
      unit="%"
      value={value === null ? "" : toPercent(value)}
      check={wrong}
      onMeasure={(text) => (text === "" ? mayBeEmpty && take(entry, null) : take(entry, fromPercent(text)))}
    />
  );
}

type NumberEntryProps = Common & {
  value: string | number | null;
  unit: string;
  /** A count takes no decimals. */
  whole?: boolean;
  least?: number;
  most?: number;
  mayBeEmpty?: boolean;
};

/** Minutes, kits, weights. */
export function NumberEntry({ entry, value, whole, least = 0, most, mayBeEmpty, ...rest }: NumberEntryProps) {
  function wrong(text: string): string | undefined {
    if (whole && !/^\d+$/.test(text)) return "Write a whole number.";
    if (!/^\d{1,9}(\.\d{1,6})?$/.test(text)) return "Write at most six decimals.";
    if (Number(text) < least) return `Write at least ${least}.`;
    if (most !== undefined && Number(text) > most) return `Write at most ${most}.`;
    return undefined;
  }
  return (
    <MeasureField
      {...rest}
      live
      value={value === null ? "" : String(value)}
      check={wrong}
      onMeasure={(text) =>
        text === "" ? mayBeEmpty && take(entry, null) : take(entry, whole ? Number(text) : text)
      }
    />
  );
}
