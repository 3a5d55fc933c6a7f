// The four sizes of a carton always side by side, and the blank: a bare size says nothing.
import { classNames } from "~/components/class-names";
import type { Carton } from "~/cartons/types";
import type { UnitName } from "~/components/preferences";
import { showLength, showSize } from "./lengths";

export function sizesOf(carton: Carton, units: UnitName): readonly { readonly name: string; readonly hint: string; readonly text: string; readonly isAsked: boolean }[] {
  const { basis } = carton.brief;
  const { blank } = carton;
  return [
    { name: "Inside", hint: "nominal, between the walls", text: showSize(carton.inside, units), isAsked: basis === "inside" },
    { name: "Clear inside", hint: "what a rigid block passes", text: showSize(carton.clearInside, units), isAsked: basis === "product" },
    { name: "Crease to crease", hint: "on the flat blank", text: showSize(carton.crease, units), isAsked: basis === "crease" },
    { name: "Outside", hint: "of the closed carton", text: showSize(carton.outside, units), isAsked: basis === "outside" },
    { name: "Blank", hint: "flat, width × height", text: `${showLength(blank.width, units)} × ${showLength(blank.height, units)} ${units}`, isAsked: false },
  ];
}

export function SizesLine({ carton, units, className }: { carton: Carton; units: UnitName; className?: string }) {
  return (
    <dl className={classNames("flex flex-wrap gap-x-7 gap-y-1", className)}>
      {sizesOf(carton, units).map(({ name, hint, text, isAsked }) => (
        <div key={name} title={hint} className="max-md:flex max-md:w-full max-md:justify-between max-md:gap-4 max-md:border-b max-md:border-rule max-md:py-1.5">
          <dt className="text-label text-ink-3">{name}</dt>
          <dd className={classNames("whitespace-nowrap text-[14px] leading-5", isAsked && "font-bold")}>{text}</dd>
        </div>
      ))}
    </dl>
  );
}
