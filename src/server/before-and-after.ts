/** The fields of a change that differ, each with what stood there before and now, for the activity log. */
export function beforeAndAfter<Row extends object>(
  before: Row,
  after: Partial<Row>,
): Record<string, [unknown, unknown]> {
  const names = Object.keys(after) as (keyof Row & string)[];
  const differ = names.filter((name) => JSON.stringify(before[name]) !== JSON.stringify(after[name]));
  return Object.fromEntries(differ.map((name) => [name, [before[name], after[name]]]));
}
