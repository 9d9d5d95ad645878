import { useEffect, useState } from "react";
import type { POST as PASTE } from "#src/pages/api/workshops/[workshop]/kits/[kit]/imports/pasted.ts";
import type { POST } from "#src/pages/api/workshops/[workshop]/kits/[kit]/imports.ts";
import type { ReplyOf } from "#src/server/route.ts";
import { UPLOAD_BYTES } from "#src/shapes/limits.ts";
import { CallFailed, call } from "../call.ts";
import { DrawersPicture } from "../parts/DrawersPicture.tsx";
import { DropArea } from "../parts/DropArea.tsx";
import { ErrorBox } from "../parts/ErrorBox.tsx";
import { Busy, Progress } from "../parts/Progress.tsx";
import { type ImportPlace, importsApi, importsPath } from "./import-place.ts";
import { PasteBox } from "./PasteBox.tsx";
import { type Sent, sendList } from "./send-list.ts";
import { sizeWords } from "./size-words.ts";

type Step =
  | { kind: "waiting" }
  | { kind: "sending"; name: string; progress: Sent | null }
  | { kind: "failed"; title: string; detail: string };

const ACCEPT =
  ".csv,.tsv,.txt,.tab,.asc,.xlsx,.xlsm,.ods,text/csv,text/plain,text/tab-separated-values,application/vnd.openxmlformats-officedocument.spreadsheetml.sheet,application/vnd.oasis.opendocument.spreadsheet";

function tooLarge(file: File): string {
  return `${file.name} has ${sizeWords(file.size)}. At most 5 MB can be read.`;
}

/** Where a list is dropped, chosen or pasted. Afterwards the page of that list opens. */
export function UploadBox({
  place,
  kits,
  words,
}: {
  place: ImportPlace;
  kits: number | null;
  words: { title: string; what: string };
}) {
  const [step, setStep] = useState<Step>({ kind: "waiting" });
  const [pasting, setPasting] = useState(false);

  async function begin(name: string, send: () => Promise<{ id: string }>) {
    setStep({ kind: "sending", name, progress: null });
    try {
      const { id } = await send();
      location.assign(importsPath(place, `/${id}`));
    } catch (error) {
      if (!(error instanceof CallFailed)) throw error;
      setStep({ kind: "failed", title: error.problem.title, detail: error.problem.detail });
    }
  }

  function sendFile(file: File) {
    if (file.size > UPLOAD_BYTES) {
      setStep({
        kind: "failed",
        title: tooLarge(file),
        detail: "Nothing was sent. Leave out what is no part of the list.",
      });
      return;
    }
    const told = (progress: Sent) => setStep({ kind: "sending", name: file.name, progress });
    void begin(file.name, () => sendList<ReplyOf<typeof POST>>(importsApi(place), file, file.name, told));
  }

  function sendText(text: string) {
    void begin("the pasted cells", () => call<typeof PASTE>("POST", importsApi(place, "/pasted"), { text }));
  }

  useEffect(() => {
    function pasted(event: ClipboardEvent) {
      const into = event.target;
      if (into instanceof HTMLElement && into.closest("input, textarea, [contenteditable]")) return;
      const text = event.clipboardData?.getData("text/plain") ?? "";
      if (text.trim() !== "") sendText(text);
    }
    document.addEventListener("paste", pasted);
    return () => document.removeEventListener("paste", pasted);
  });

  if (step.kind === "sending") return <Sending name={step.name} progress={step.progress} />;
  return (
    <div className="flex flex-col gap-4">
      {step.kind === "failed" && (
        <ErrorBox title={step.title} alert>
          <p>{step.detail} Nothing was changed.</p>
        </ErrorBox>
      )}
      <DropArea
        title={words.title}
        accept={ACCEPT}
        onFile={sendFile}
        onPaste={() => setPasting(true)}
        picture={kits !== null && <DrawersPicture kits={kits} />}
      >
        <p>
          {words.what} Any columns in any order; you say what each means. CSV, TSV, XLSX or ODS, to{" "}
          {"5\u00a0MB and 20\u00a0000 rows"}.
        </p>
      </DropArea>
      {pasting && <PasteBox onText={sendText} onLeave={() => setPasting(false)} />}
    </div>
  );
}

function Sending({ name, progress }: { name: string; progress: Sent | null }) {
  const under = progress !== null && progress.sent < progress.of;
  return (
    <div className="rounded-control border-[1.5px] border-rule-2 bg-sheet px-5 py-4">
      <h2 className="type-h3 mb-2">{name}</h2>
      {under ? (
        <Progress
          done={Math.round(progress.sent / 1000)}
          of={Math.round(progress.of / 1000)}
          what="kB sent"
        />
      ) : (
        <Busy verb="Reading the rows" />
      )}
    </div>
  );
}
