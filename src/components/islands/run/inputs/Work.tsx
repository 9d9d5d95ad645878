import { addRow, removeRow } from "#src/components/islands/plan/plan-lists.ts";
import type { PlanTask } from "#src/shapes/plan.ts";
import { EditionsEntry } from "./EditionsEntry.tsx";
import { EntryTable } from "./EntryTable.tsx";
import { AmountEntry, NumberEntry, RateEntry } from "./fields.tsx";
import type { InputProps } from "./input-props.ts";
import { NameEntry } from "./NameEntry.tsx";

/** What an hour costs, how much faster one gets, and the tasks. */
export function Work({ address, held, may }: InputProps) {
  const { plan } = held;
  const { work, currency } = plan;
  const off = !may.changeRun;
  const run = (field: string) => ({ address, row: { kind: "run" } as const, field, currency });
  return (
    <>
      <div className="mb-6 grid gap-x-6 gap-y-5 tablet:grid-cols-2 desktop:grid-cols-3">
        <AmountEntry
          id="hour-rate"
          label="An hour of your own work"
          hint="For every kit of the workshop. 0 counts the hours at nothing."
          unit="an hour"
          mayBeEmpty
          off={off}
          value={work.ratePerHour}
          entry={{ address, row: { kind: "hour-rate" }, field: "ratePerHour", currency }}
        />
        <RateEntry
          label="Time of a doubled number"
          hint="100 %: no faster with practice. 90 %: kit 20 takes 90 % of kit 10."
          most={100}
          off={off}
          value={work.learningSlope}
          entry={run("learningSlope")}
        />
        <NumberEntry
          label="Kits made before"
          whole
          most={1_000_000}
          unit="kits"
          off={off}
          value={work.kitsMadeBefore}
          entry={run("kitsMadeBefore")}
        />
      </div>
      <Tasks address={address} held={held} off={off} />
    </>
  );
}

function Tasks({ address, held, off }: Pick<InputProps, "address" | "held"> & { off: boolean }) {
  const { work, editions, currency } = held.plan;
  const entry = (field: string, { id, name }: PlanTask) => ({
    address,
    row: { kind: "task", id } as const,
    field,
    currency,
    thing: name,
  });
  const minutes = (field: "minutesPerKit" | "setUpMinutes", label: string) => (task: PlanTask) => (
    <NumberEntry
      label={`${label} of ${task.name}`}
      labelHidden
      row
      most={100_000}
      unit="min"
      off={off}
      value={task[field]}
      entry={entry(field, task)}
    />
  );
  return (
    <EntryTable
      caption="Tasks"
      rows={work.tasks}
      columns={[
        {
          head: "Task",
          cell: (task) => <NameEntry value={task.name} off={off} entry={entry("name", task)} />,
        },
        {
          head: "For a kit",
          number: true,
          className: "w-40",
          cell: minutes("minutesPerKit", "Minutes for a kit"),
        },
        {
          head: "To set up",
          number: true,
          className: "w-40",
          cell: minutes("setUpMinutes", "Minutes to set up"),
        },
        ...(editions.length > 1
          ? [
              {
                head: "Editions",
                cell: (task: PlanTask) => (
                  <EditionsEntry
                    value={task.editions}
                    editions={editions}
                    off={off}
                    entry={entry("editions", task)}
                  />
                ),
              },
            ]
          : []),
      ]}
      edit={
        off
          ? undefined
          : {
              add: "Add a task",
              onAdd: (name) =>
                addRow(address, "task", { name, editions: null, minutesPerKit: "0", setUpMinutes: "0" }),
              onRemove: ({ id, name }) => void removeRow(address, "task", id, name),
            }
      }
    />
  );
}
