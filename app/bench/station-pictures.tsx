// Small true pictures above the lever's stations, from the pose that is checked.
import { memo, useDeferredValue } from "react";
import type { Carton } from "~/cartons/types";
import { FoldedPicture } from "./folded-picture";
import { FlatPicture } from "./stage/flat-picture";

export default function StationPictures({ carton, onPick }: { carton: Carton; onPick: (u: number) => void }) {
  // While a figure is dragged the drawing comes first; the pictures follow when there is time.
  const shown = useDeferredValue(carton);
  return <Pictures carton={shown} onPick={onPick} />;
}

const Pictures = memo(function Pictures({ carton, onPick }: { carton: Carton; onPick: (u: number) => void }) {
  const { steps } = carton.fold;
  return (
    <div className="pointer-events-none absolute inset-x-9 top-1.5 h-12">
      {Array.from({ length: steps.length + 1 }, (_, i) => (
        <span key={i} onClick={() => onPick(i)} className="pointer-events-auto absolute flex h-12 w-16 -translate-x-1/2 cursor-pointer items-center justify-center" style={{ left: `${(i / steps.length) * 100}%` }}>
          {i === 0 ? <FlatPicture carton={carton} width={64} height={46} /> : <FoldedPicture carton={carton} u={i} width={64} height={46} />}
        </span>
      ))}
    </div>
  );
});
