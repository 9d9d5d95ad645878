import { requireBrowser, route } from "#src/server/route.ts";
import { changeSettings, deleteWorkshop, settingsOf } from "#src/server/workshop.ts";
import { WorkshopChange, WorkshopRemoval } from "#src/shapes/workshop.ts";

export const GET = route({ may: "manage-workshop", run: ({ workshop }) => settingsOf(workshop) });

export const PATCH = route({
  may: "manage-workshop",
  input: WorkshopChange,
  run: ({ input, ...given }) => changeSettings(given, input),
});

export const DELETE = route({
  may: "manage-workshop",
  input: WorkshopRemoval,
  run: ({ input, ...given }) => {
    requireBrowser(given.session);
    deleteWorkshop(given, input.name);
  },
});
