import { exact } from "#src/costing/decimal.ts";
import { dayAfter, daysBetween, mondayOf } from "./days.ts";

/** One order that has to arrive before the run is packed. */
export interface CalendarOrder {
  id: string;
  /** Supplier or board house. */
  name: string;
  /** Days from order to arrival, the longest of its lines; `null`: not known. */
  leadDays: number | null;
  /** What it costs, landed, as decimal text in the reporting currency; `null`: not known. */
  cost: string | null;
}

export interface CalendarInput {
  /** ISO 8601 days. */
  today: string;
  packingDay: string;
  /** Days kept between the last arrival and packing, for counting in and testing. */
  spareDays: number;
  orders: readonly CalendarOrder[];
}

/** When one order must leave. */
export interface OrderDates {
  id: string;
  name: string;
  /** `null` while its lead time is not known. */
  orderBy: string | null;
  arrivesBy: string;
  /** Where it is ordered today. */
  arrivesIfToday: string | null;
  /** Days from today to `orderBy`; negative where it is too late. */
  daysLeft: number | null;
  cost: string | null;
}

/** What leaves the purse in a week, and up to its end. */
export interface WeekOut {
  /** The Monday of the week. */
  monday: string;
  out: string;
  outSoFar: string;
}

export interface OrderCalendar {
  /** By the day they must leave, those without one last; then by name. */
  orders: OrderDates[];
  /** Weeks in which something is ordered. What is late counts in this week. `null` where a cost or day is not known. */
  weeks: WeekOut[] | null;
  /** The most money out at once: all orders paid, on the day the last of them leaves. */
  mostOut: { amount: string; from: string } | null;
  /** The earliest day on which the run can be packed, if everything is ordered today. */
  soonestPacking: string | null;
}

function datesOf(order: CalendarOrder, { today, packingDay, spareDays }: CalendarInput): OrderDates {
  const { id, name, leadDays, cost } = order;
  const arrivesBy = dayAfter(packingDay, -spareDays);
  const orderBy = leadDays === null ? null : dayAfter(arrivesBy, -leadDays);
  return {
    ...{ id, name, orderBy, arrivesBy, cost },
    arrivesIfToday: leadDays === null ? null : dayAfter(today, leadDays),
    daysLeft: orderBy === null ? null : daysBetween(today, orderBy),
  };
}

function earlierFirst(a: OrderDates, b: OrderDates): number {
  if (a.orderBy !== b.orderBy) {
    if (a.orderBy === null) return 1;
    if (b.orderBy === null) return -1;
    return a.orderBy < b.orderBy ? -1 : 1;
  }
  return a.name < b.name ? -1 : a.name > b.name ? 1 : 0;
}

/** The day the money leaves: with the order, which cannot be earlier than today. */
function paidOn({ orderBy }: OrderDates, today: string): string | null {
  return orderBy === null || orderBy > today ? orderBy : today;
}

function weeksOf(orders: readonly OrderDates[], today: string): WeekOut[] | null {
  const out = new Map<string, string>();
  for (const order of orders) {
    const day = paidOn(order, today);
    if (day === null || order.cost === null) return null;
    const monday = mondayOf(day);
    out.set(
      monday,
      exact(out.get(monday) ?? "0")
        .plus(order.cost)
        .toFixed(),
    );
  }
  let soFar = exact("0");
  return [...out]
    .sort(([a], [b]) => (a < b ? -1 : 1))
    .map(([monday, amount]) => {
      soFar = soFar.plus(amount);
      return { monday, out: amount, outSoFar: soFar.toFixed() };
    });
}

/**
 * Works back from the day of packing: each order leaves its lead time and the spare days before it (calendar days, as
 * suppliers state them), and is paid when it leaves. Nothing comes in before the run is packed, so the most money out
 * at once is what all orders cost together. Common practice, no source.
 *
 * @example packing on 3 April with 4 spare days, 12 days from order to arrival: order by 18 March
 */
export function orderCalendar(input: CalendarInput): OrderCalendar {
  const { today, spareDays } = input;
  const orders = input.orders.map((order) => datesOf(order, input)).sort(earlierFirst);
  const weeks = weeksOf(orders, today);
  const last = orders.at(-1);
  const arrivals = orders.map(({ arrivesIfToday }) => arrivesIfToday);
  const latest = arrivals.reduce<string | null>(
    (a, b) => (b !== null && (a === null || b > a) ? b : a),
    null,
  );
  return {
    orders,
    weeks,
    mostOut:
      weeks === null || weeks.length === 0 || last === undefined
        ? null
        : { amount: weeks.at(-1)?.outSoFar ?? "0", from: paidOn(last, today) ?? today },
    soonestPacking: latest === null || arrivals.includes(null) ? null : dayAfter(latest, spareDays),
  };
}
