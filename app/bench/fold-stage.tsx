// The stage while the lever is off its stop. Fetched on first use: it brings the 3-D code with it.
import { useLayoutEffect, useMemo, useRef, useState } from "react";
import { useBench } from "./bench-context";
import { FoldView } from "./fold-view.client";
import { clampTo, type Lever, leverWords, useLever } from "./lever";
import { fitted, type Frame, type Insets } from "./view";

/** Room for the figures that stand round the flat drawing, so that the lift begins about where the drawing was. */
const AROUND: Insets = { left: 90, right: 70, top: 84, bottom: 74 };

export default function FoldStage({ lever }: { lever: Lever }) {
  const { session, litPanels, lightPanels } = useBench();
  const { carton } = session;
  const u = clampTo(carton.fold, useLever(lever));
  const ref = useRef<HTMLDivElement>(null);
  const [frame, setFrame] = useState<Frame | null>(null);
  useLayoutEffect(() => {
    const element = ref.current;
    if (!element) return;
    const measure = () => setFrame({ width: element.clientWidth, height: element.clientHeight });
    const watch = new ResizeObserver(measure);
    watch.observe(element);
    measure();
    return () => watch.disconnect();
  }, []);
  const drawing = useMemo(() => (frame ? fitted(carton.blank.bounds, frame, AROUND) : null), [carton, frame]);
  const { station, detail } = leverWords(carton.fold, u);
  return (
    <div ref={ref} className="absolute inset-0">
      {drawing && (
        <FoldView
          carton={carton} u={u} drawing={drawing} litPanels={litPanels} onHoverPanel={(panel) => lightPanels(panel ? [panel] : [])}
          label={`${carton.construction.name}, ${[station, detail].filter(Boolean).join(", ")}. Arrow keys turn it, plus and minus zoom, 0 turns it back.`}
        />
      )}
    </div>
  );
}
