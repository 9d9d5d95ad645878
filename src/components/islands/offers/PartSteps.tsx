import { buttonLook } from "#src/components/button-look.ts";
import { compressDesignators } from "#src/partslist/designators.ts";
import type { OfferPart } from "#src/server/kit-offers.ts";
import type { PlanPart } from "#src/shapes/plan.ts";
import { lineText } from "./offer-words.ts";
import { PartPicture } from "./PartPicture.tsx";

export interface PartStepsProps {
  parts: readonly OfferPart[];
  part: OfferPart;
  planned: PlanPart | undefined;
  hrefOf: (part: string) => string;
}

/** Which line this is, with the way to the one before and the one after. */
export function PartSteps({ parts, part, planned, hrefOf }: PartStepsProps) {
  const place = parts.findIndex(({ id }) => id === part.id);
  return (
    <nav aria-label="Lines" className="mb-4 flex items-center gap-4">
      <Step to={parts[place - 1]} hrefOf={hrefOf} back />
      <PartPicture part={part} />
      <p className="min-w-0 grow tablet:grow-0">
        <b>
          {lineText(part)}
          {part.designators && `, ${compressDesignators(part.designators.split(", "))}`}
        </b>
        <span className="text-ink-2 max-tablet:hidden">
          {" "}
          of {parts.length}, {[part.name, part.spec].filter(Boolean).join(", ")}
          {perKitText(planned)}
        </span>
      </p>
      <Step to={parts[place + 1]} hrefOf={hrefOf} />
    </nav>
  );
}

/** "6 in each kit", or "up to 6 in a kit" where editions differ. */
function perKitText(planned: PlanPart | undefined): string {
  const counts = planned?.quantities.map(({ perKit }) => perKit) ?? [];
  if (counts.length === 0) return "";
  const most = Math.max(...counts);
  return counts.every((perKit) => perKit === most) ? `, ${most} in each kit` : `, up to ${most} in a kit`;
}

function Step({
  to,
  hrefOf,
  back,
}: {
  to: OfferPart | undefined;
  hrefOf: (part: string) => string;
  back?: boolean;
}) {
  const words = back ? "The line before" : "The next line";
  const arrow = (
    <svg viewBox="0 0 18 18" className="size-[18px]" aria-hidden="true">
      <path
        d={back ? "M15 9H4M8.5 4 3.5 9l5 5" : "M3 9h11M9.5 4l5 5-5 5"}
        fill="none"
        stroke="currentColor"
        strokeWidth={2}
      />
    </svg>
  );
  if (!to)
    return (
      <span className={`${buttonLook("secondary", "normal", "off")} w-11 px-0!`}>
        {arrow}
        <span className="heard-only">{back ? "This is the first line" : "This is the last line"}</span>
      </span>
    );
  return (
    <a href={hrefOf(to.id)} className={`${buttonLook()} w-11 px-0!`}>
      {arrow}
      <span className="heard-only">
        {words}: {to.name}
      </span>
    </a>
  );
}
