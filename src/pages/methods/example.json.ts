import type { APIRoute } from "astro";
import { METHOD_EXAMPLE } from "#src/server/method-example.ts";

/** The plan that the method pages reckon with, as a file that a run page reads. */
export const GET: APIRoute = () =>
  new Response(JSON.stringify(METHOD_EXAMPLE, null, 2), {
    headers: {
      "content-type": "application/json",
      "content-disposition": 'attachment; filename="tinpenny-example-plan.json"',
    },
  });
