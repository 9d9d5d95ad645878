import { type FormEvent, useState } from "react";
import { call } from "#src/components/islands/call.ts";
import { type KitAddress, kitApi } from "#src/components/islands/kit-address.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { ChoiceField } from "#src/components/islands/parts/ChoiceField.tsx";
import { TextField } from "#src/components/islands/parts/TextField.tsx";
import { saving } from "#src/components/islands/plan/saving.ts";
import type { POST } from "#src/pages/api/workshops/[workshop]/kits/[kit]/editions/index.ts";
import type { EditionView } from "#src/server/present.ts";
import { refusal } from "./edition-refusal.ts";

/** An edition that is added, with what is in another one to begin with. */
export function NewEdition({
  address,
  editions,
  onMade,
}: {
  address: KitAddress;
  editions: readonly EditionView[];
  onMade: (edition: EditionView) => void;
}) {
  const [name, setName] = useState("");
  const [like, setLike] = useState(editions[0]?.id ?? "");
  const [wrong, setWrong] = useState<string>();
  const pattern = editions.find(({ id }) => id === like);

  async function add(submit: FormEvent) {
    submit.preventDefault();
    try {
      const boardsPerKit = pattern?.boardsPerKit ?? editions[0]?.boardsPerKit ?? 1;
      const body = { name, weight: 1, boardsPerKit, like: pattern ? like : null };
      const made = await call<typeof POST>("POST", kitApi(address, "/editions"), body);
      setName("");
      setWrong(undefined);
      if (made) onMade(made);
      saving.change((now) => ({ ...now, savedAt: Date.now() }));
    } catch (error) {
      setWrong(refusal(error));
    }
  }

  return (
    <form onSubmit={(submit) => void add(submit)} className="mt-5 flex flex-wrap items-start gap-x-5 gap-y-3">
      <TextField
        label="Another edition"
        className="w-full tablet:w-64"
        placeholder="Bare board"
        value={name}
        wrong={wrong}
        onChange={({ currentTarget }) => setName(currentTarget.value)}
      />
      <ChoiceField
        label="Begins with"
        className="w-full tablet:w-72"
        value={like}
        choices={[
          ...editions.map(({ id, name: called }) => ({ value: id, label: `what is in ${called}` })),
          { value: "", label: "nothing" },
        ]}
        onChange={({ currentTarget }) => setLike(currentTarget.value)}
      />
      <Button type="submit" className="tablet:mt-[26px]">
        Add the edition
      </Button>
    </form>
  );
}
