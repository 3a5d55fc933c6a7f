// Which line is which, how much of it there is, and whether it is shown.
import { classNames } from "~/components/class-names";
import type { UnitName } from "~/components/preferences";
import type { Carton, LayerName } from "~/cartons/types";
import { showLength } from "../lengths";
import { layerWords, legendOrder, lineCode } from "./line-code";

export function Legend({ carton, hidden, onToggle, units, className }: { carton: Carton; hidden: ReadonlySet<LayerName>; onToggle: (name: LayerName) => void; units: UnitName; className?: string }) {
  return (
    <div role="group" aria-label="Layers" className={classNames("flex flex-wrap items-center gap-x-5 gap-y-1 text-small", className)}>
      <span className="font-bold">Layers</span>
      {legendOrder.filter((name) => carton.layers[name].length > 0).map((name) => {
        const isShown = !hidden.has(name);
        return (
          <button
            key={name}
            type="button"
            aria-pressed={isShown}
            onClick={() => onToggle(name)}
            className={classNames("inline-flex min-h-6 items-center gap-2 hover:text-live max-md:min-h-11", !isShown && "text-ink-3 line-through decoration-rule-2")}
          >
            <Swatch name={name} />
            {layerWords[name]}
            <span className="text-ink-3">{measureOf(carton, name, units)}</span>
          </button>
        );
      })}
    </div>
  );
}

/** Lengths for lines; a width, named as such, for bleed and safe area. */
function measureOf(carton: Carton, name: LayerName, units: UnitName): string {
  const width = carton.parameters[name];
  if (name === "bleed" || name === "safe") return typeof width === "number" ? `${showLength(width, units)} wide` : "";
  if (name === "glue") return "";
  const mm = carton.lengths[name];
  return units === "mm" ? `${Math.round(mm)} mm` : `${(mm / 25.4).toFixed(1)} in`;
}

export function Swatch({ name }: { name: LayerName }) {
  if (name === "bleed") return <Box fill="var(--layer-bleed-tint)" stroke="var(--layer-bleed)" />;
  if (name === "glue" || name === "safe") {
    return (
      <svg width={26} height={12} aria-hidden>
        <path d={name === "glue" ? "M0 12 12 0M7 12 19 0M14 12 26 0" : "M0 0 12 12M7 0 19 12M14 0 26 12"} stroke={name === "glue" ? "var(--layer-glue)" : "var(--layer-safe)"} strokeWidth={1} />
      </svg>
    );
  }
  const { colour, width, dash, isCased } = lineCode[name];
  return (
    <svg width={30} height={8} aria-hidden>
      {isCased && <path d="M0 4H30" stroke="var(--layer-case)" strokeWidth={width + 0.9} strokeDasharray={dash.join(" ")} />}
      <path d="M0 4H30" stroke={colour} strokeWidth={width} strokeDasharray={dash.join(" ") || undefined} />
    </svg>
  );
}

function Box({ fill, stroke }: { fill: string; stroke: string }) {
  return (
    <svg width={26} height={12} aria-hidden>
      <path d="M.5.5h25v11H.5z" fill={fill} stroke={stroke} />
    </svg>
  );
}
