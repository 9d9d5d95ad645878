import { requireBrowser, route } from "#src/server/route.ts";
import { changeSettings, deleteWorkshop, settingsOf } from "#src/server/workshop.ts";
import { WorkshopChange, WorkshopRemoval } from "#src/shapes/workshop.ts";

/** The settings of a workshop. */
export const GET = route({ may: "manage-workshop", run: ({ workshop }) => settingsOf(workshop) });

/** Changes a workshop's name or currency. */
export const PATCH = route({
  may: "manage-workshop",
  input: WorkshopChange,
  run: ({ input, ...given }) => changeSettings(given, input),
});

/** Deletes a workshop with everything in it, once its name was typed. */
export const DELETE = route({
  may: "manage-workshop",
  input: WorkshopRemoval,
  run: ({ input, ...given }) => {
    requireBrowser(given.session);
    deleteWorkshop(given, input.name);
  },
});
