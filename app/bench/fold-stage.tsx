// The stage while the lever is off its stop. Fetched on first use: it brings the 3-D code with it.
import { type RefObject, useEffect } from "react";
import { useBench } from "./bench-context";
import { FoldView } from "./fold-view.client";
import { clampTo, type Lever, leverWords, useLever } from "./lever";
import type { View } from "./view";

export default function FoldStage({ lever, drawing, onReady }: { lever: Lever; drawing: RefObject<View | null>; onReady: () => void }) {
  const { session, litPanels, lightPanels } = useBench();
  const { carton } = session;
  const u = clampTo(carton.fold, useLever(lever));
  const { station, detail } = leverWords(carton.fold, u);
  useEffect(onReady, [onReady]);
  if (!drawing.current) return null;
  return (
    <FoldView
      carton={carton}
      u={u}
      drawing={drawing.current}
      litPanels={litPanels}
      onHoverPanel={(panel) => lightPanels(panel === null ? [] : [panel])}
      label={`${carton.construction.name}, ${station}${detail ? `, ${detail}` : ""}. Arrow keys turn it, plus and minus zoom, 0 turns it back.`}
    />
  );
}
