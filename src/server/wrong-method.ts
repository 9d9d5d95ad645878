import { Problem } from "./problem.ts";

const METHODS = ["GET", "POST", "PUT", "PATCH", "DELETE"] as const;

/** Methods an address takes, by what its module exports; who may GET may also ask for the HEAD alone. */
function methodsOf(routes: Record<string, unknown>): string[] {
  return METHODS.filter((method) => method in routes).flatMap((method) =>
    method === "GET" ? ["GET", "HEAD"] : [method],
  );
}

/** What is answered where nothing took a request: 404 without a module at the address, else 405 with its methods. */
export function notTaken(method: string, routes: Record<string, unknown> | undefined): Problem {
  if (!routes) return new Problem("not-found");
  const methods = methodsOf(routes).join(", ");
  return new Problem("not-this-method", { parameters: { method, methods }, headers: { allow: methods } });
}
