import { HATCHES } from "#src/components/islands/chart-theme.ts";

/** The hatch patterns, for `<defs>` of a chart or drawing: `fill={hatchFill("loss")}`. */
export function HatchDefs() {
  return (
    <>
      {Object.values(HATCHES).map(({ id, ground, line, apart, width }) => (
        <pattern
          key={id}
          id={id}
          width={apart}
          height={apart}
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <rect width={apart} height={apart} fill={ground} />
          <path d={`M0 0V${apart}`} stroke={line} strokeWidth={width} />
        </pattern>
      ))}
    </>
  );
}
