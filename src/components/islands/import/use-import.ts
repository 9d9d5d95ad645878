import { useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import { useEffect } from "react";
import type { PATCH as PATCH_PARTS } from "#src/pages/api/workshops/[workshop]/kits/[kit]/imports/[import].ts";
import type { PartsImportView } from "#src/server/parts-import.ts";
import type { PriceImportView } from "#src/server/price-import.ts";
import type { DraftEdit } from "#src/shapes/import.ts";
import { CallFailed, call } from "../call.ts";
import { showToast } from "../parts/toasts.ts";
import { watchLeaving } from "../plan/leaving.ts";
import { answeredAtOnce } from "./answered-at-once.ts";
import { type ImportPlace, importKeys, importsApi } from "./import-place.ts";

export type ImportView = PartsImportView | PriceImportView;
/** An edit without the version: that is the one in the cache when the edit is sent. */
export type Edit = Omit<DraftEdit, "version">;

export interface DraftHandle {
  view: ImportView;
  edit: (edit: Edit) => void;
  /** An edit is on its way; figures are those from before. */
  busy: boolean;
  /** Somebody else changed the draft: nothing of this edit was kept. */
  clash: boolean;
  reload: () => void;
}

/**
 * A draft on the server, kept in step: answers show at once, the rows and counts they lead to come back with the reply.
 * Edits go one after the other, each with the version the one before it left.
 */
export function useDraft(place: ImportPlace, initial: ImportView): DraftHandle {
  const key = importKeys.one(initial.file.id);
  const path = importsApi(place, `/${initial.file.id}`);
  const queryClient = useQueryClient();
  const { data: view, refetch } = useQuery({
    queryKey: key,
    queryFn: () => call<typeof PATCH_PARTS>("GET", path) as Promise<ImportView>,
    initialData: initial,
  });

  const mutation = useMutation({
    mutationKey: key,
    scope: { id: path },
    mutationFn: (edit: Edit) => {
      const { version } = (queryClient.getQueryData<ImportView>(key) ?? view).file;
      return call<typeof PATCH_PARTS>("PATCH", path, { ...edit, version }) as Promise<ImportView>;
    },
    onMutate: async (edit) => {
      await queryClient.cancelQueries({ queryKey: key });
      const before = queryClient.getQueryData<ImportView>(key);
      if (before) queryClient.setQueryData(key, answeredAtOnce(before, edit));
      return before;
    },
    onSuccess: (reply) => queryClient.setQueryData(key, reply),
    onError: (error, _edit, before) => {
      if (before) queryClient.setQueryData(key, before);
      if (!(error instanceof CallFailed)) throw error;
      if (error.problem.code !== "changed-meanwhile")
        showToast({ kind: "fault", text: `${error.problem.title} ${error.problem.detail}` });
    },
  });

  useEffect(() => {
    const edits = () => queryClient.isMutating({ mutationKey: importKeys.one(initial.file.id) });
    return watchLeaving({ flush() {}, holds: () => edits() > 0, atRisk: () => edits() > 1 });
  }, [queryClient, initial.file.id]);

  const { error } = mutation;
  return {
    view,
    edit: mutation.mutate,
    busy: mutation.isPending,
    clash: error instanceof CallFailed && error.problem.code === "changed-meanwhile",
    reload: () => {
      mutation.reset();
      void refetch();
    },
  };
}
