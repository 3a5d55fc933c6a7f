// Under the drawing on a phone: what was asked in three cells, and the rest of the sizes below.
import type { ReactNode } from "react";
import { Switch } from "~/components/button";
import { classNames } from "~/components/class-names";
import { usePreferences } from "~/components/preferences";
import type { Axis } from "~/cartons/types";
import { axisWords } from "~/copy/fold-check";
import { BasisSelect, BoardSelect } from "./asked-selects";
import { refusalOf, useBench } from "./bench-context";
import { Figure } from "./figure";
import { RefusalLine } from "./refusal-line";
import { SizesLine } from "./sizes-line";
import { scaleWords } from "./view";

const axes: readonly Axis[] = ["L", "W", "D"];

export function PhoneStrip({ scale, legend }: { scale: number | null; legend: ReactNode }) {
  const { session, lit } = useBench();
  const { units, setUnits } = usePreferences();
  return (
    <div>
      <div className="flex items-center gap-4 px-4 py-2">
        <span className="whitespace-nowrap text-small text-ink-2">{scale === null ? "" : scaleWords(scale)}</span>
        <details className="group min-w-0 flex-1">
          <summary className="inline-flex min-h-11 cursor-pointer list-none items-center text-small underline decoration-rule-2 underline-offset-4 [&::-webkit-details-marker]:hidden">Layers and legend</summary>
          {legend}
        </details>
        <Switch label="Units" value={units} onChange={setUnits} choices={[{ value: "mm", label: "mm" }, { value: "in", label: "in" }]} className="self-start" />
      </div>
      <div className="relative grid grid-cols-3 border-y-2 border-ink">
        {axes.map((axis) => (
          <div key={axis} className={classNames("border-r border-rule px-4 py-1.5 last:border-r-0 focus-within:bg-wash", lit?.row === `asked:${axis}` && "bg-wash")}>
            <p className="text-label text-ink-2">{axisWords[axis]}</p>
            <Figure parameter={axis} label={axisWords[axis]} kind="length" look="strip" row={`asked:${axis}`} className="no-underline!" />
          </div>
        ))}
      </div>
      <div className="px-4">
        {axes.map((axis) => {
          const refusal = refusalOf(session, axis);
          return refusal && <RefusalLine key={axis} refusal={refusal} />;
        })}
        <div className="flex items-center justify-between gap-4 border-b border-rule text-small"><span className="text-ink-2">These sizes are</span><BasisSelect /></div>
        <div className="flex items-center justify-between gap-4 border-b border-rule text-small"><span className="text-ink-2">Board</span><BoardSelect /></div>
        <SizesLine carton={session.carton} units={units} />
      </div>
    </div>
  );
}
