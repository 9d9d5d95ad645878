import makeGlpk from "glpk.js/node";
import loadHighs from "highs";
import type { Program, Term } from "./as-linear-program.ts";

/** What a general solver says of a program: its least objective, null where there is none, and what it chose. */
export interface Solved {
  objective: number | null;
  chosen: (name: string) => boolean;
}

export type Solver = (program: Program) => Solved;

/** HiGHS, to the last cent: no gap is left open. */
export async function highs(): Promise<Solver> {
  const solver = await loadHighs();
  return (program) => {
    const solved = solver.solve(asText(program), { mip_rel_gap: 0, mip_abs_gap: 1e-6 });
    if (solved.Status !== "Optimal") return { objective: null, chosen: () => false };
    const columns = solved.Columns as Record<string, { Primal?: number }>;
    return {
      objective: solved.ObjectiveValue,
      chosen: (name) => (columns[name]?.Primal ?? 0) > 0.5,
    };
  };
}

/** CPLEX LP format, as HiGHS reads it. */
function asText({ objective, rows, whole, binary }: Program): string {
  const sum = (terms: readonly Term[]) => {
    const written = terms
      .filter(({ by }) => by !== 0)
      .map(({ name, by }) => `${by < 0 ? "-" : "+"} ${Math.abs(by)} ${name}`);
    return written.length === 0 ? "0 none" : written.join(" ");
  };
  return [
    "Minimize",
    ` cost: ${sum(objective)}`,
    "Subject To",
    ...rows.map(({ terms, relation, value }, at) => ` r${at}: ${sum(terms)} ${relation} ${value}`),
    "General",
    ` ${whole.join(" ")}`,
    "Binary",
    ` ${binary.join(" ")}`,
    "End",
  ].join("\n");
}

/** GLPK, which shares no code with HiGHS. */
export async function glpk(): Promise<Solver> {
  const solver = await makeGlpk();
  const relations = { ">=": solver.GLP_LO, "<=": solver.GLP_UP, "=": solver.GLP_FX };
  const vars = (terms: readonly Term[]) =>
    terms.filter(({ by }) => by !== 0).map(({ name, by }) => ({ name, coef: by }));
  return ({ objective, rows, whole, binary }) => {
    const { result } = solver.solve(
      {
        name: "sourcing",
        objective: { direction: solver.GLP_MIN, name: "cost", vars: vars(objective) },
        subjectTo: rows.map(({ terms, relation, value }, at) => ({
          name: `r${at}`,
          vars: vars(terms),
          bnds: { type: relations[relation], lb: value, ub: value },
        })),
        binaries: binary,
        generals: whole,
      },
      { msglev: solver.GLP_MSG_OFF, mipgap: 0, presol: true },
    );
    if (result.status !== solver.GLP_OPT) return { objective: null, chosen: () => false };
    return { objective: result.z, chosen: (name) => (result.vars[name] ?? 0) > 0.5 };
  };
}
