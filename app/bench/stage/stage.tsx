// The flat drawing on its stage. It draws what the core gives; it measures nothing but pixels.
import { useCallback, useEffect, useLayoutEffect, useMemo, useRef, useState } from "react";
import { classNames } from "~/components/class-names";
import type { Dimension } from "~/cartons/export/drawing";
import { seenPoint } from "~/cartons/export/sheet-view";
import type { Finding, LayerName } from "~/cartons/types";
import { type Side, useBench } from "../bench-context";
import { showLength, showSize } from "../lengths";
import { type Frame, type Insets, toStage, type View } from "../view";
import { DimensionLines, LitMark } from "./dimensions";
import { Figures, Words } from "./figures";
import { dataOf, Layers } from "./layers";
import { Rulers } from "./rulers";
import { blankBox, fitDrawing, useDrawing } from "./use-drawing";
import type { PanZoom } from "./use-pan-zoom";
import { usePanZoom } from "./use-pan-zoom";

export interface StageProps {
  side: Side;
  hidden: ReadonlySet<LayerName>;
  /** Phone: only what was asked and the blank's own size, no rulers, no names. */
  isCompact: boolean;
  findings: readonly Finding[];
  /** Where the drawing lies now: told on every change of it. */
  onView: (view: View, controls: PanZoom) => void;
  className?: string;
}

const WIDE: Insets = { left: 34, right: 24, top: 28, bottom: 20 };
const COMPACT: Insets = { left: 14, right: 14, top: 6, bottom: 6 };

export function Stage({ side, hidden, isCompact, findings, onView, className }: StageProps) {
  const { session, units, lit, litPanels } = useBench();
  const { carton } = session;
  const ref = useRef<HTMLDivElement>(null);
  const frame = useFrame(ref);
  const fittedView = useFit(frame, side, isCompact);
  const latest = useRef<View | null>(null);
  const controls = usePanZoom(ref, latest);
  const view = controls.own ?? fittedView;
  latest.current = view;

  useEffect(() => {
    if (view) onView(view, controls);
    // The controls are made anew on each render and do the same.
  }, [view, onView]);

  return (
    <div
      ref={ref}
      tabIndex={0}
      role="group"
      aria-label="Drawing. Arrow keys move it, plus and minus zoom, 0 fits it, 1 is true size."
      {...controls.handlers}
      className={classNames("touch-pan-y select-none overflow-hidden outline-offset-[-2px]", controls.own && "touch-none", className)}
    >
      {view && frame && <Drawn {...{ view, frame, side, hidden, isCompact, findings, units, lit: lit?.row ?? null, litPanels, carton }} />}
      <p className="sr-only">
        Blank {showLength(carton.blank.width, units)} × {showLength(carton.blank.height, units)} {units}, seen from the {side === "inside" ? "inside" : "print side"}. Inside {showSize(carton.inside, units)}. Panels:{" "}
        {carton.panels.map((panel) => `${panel.label} ${showLength(panel.bounds.maxX - panel.bounds.minX, units)} × ${showLength(panel.bounds.maxY - panel.bounds.minY, units)}`).join(", ")}. The Ledger has every figure.
      </p>
    </div>
  );
}

function Drawn({ view, frame, side, hidden, isCompact, findings, lit, litPanels }: { view: View; frame: Frame; side: Side; hidden: ReadonlySet<LayerName>; isCompact: boolean; findings: readonly Finding[]; lit: string | null; litPanels: readonly string[] }) {
  const { session, units } = useBench();
  const { carton } = session;
  const drawing = useDrawing(carton, side, view.scale);
  const textOf = useCallback((d: Dimension) => showLength(d.value, units), [units]);
  const isOnDrawing = lit !== null && drawing.dimensions.some((d) => d.row === lit);
  const row = lit !== null && !isOnDrawing ? carton.ledger.find((r) => r.id === lit && r.mark) : undefined;
  const panels = useMemo(() => carton.panels.filter((panel) => litPanels.includes(panel.name)), [carton, litPanels]);
  return (
    <>
      <svg width={frame.width} height={frame.height} className="absolute inset-0 block" aria-hidden>
        <g transform={`translate(${view.x} ${view.y}) scale(${view.scale})`}>
          {/* Twin creases stay two lines: small drawings have thinner ones. */}
          <Layers carton={carton} side={side} hidden={hidden} scale={view.scale} thin={view.scale < 0.8 ? 0.65 : 1} />
          <g transform={side === "print" ? "scale(-1 1)" : undefined} fill="var(--wash)" fillOpacity={0.75} stroke="var(--live-line)" strokeWidth={1.75} vectorEffect="non-scaling-stroke">
            {panels.map((panel) => <path key={panel.name} d={dataOf(panel.outline)} vectorEffect="non-scaling-stroke" />)}
          </g>
        </g>
        <DimensionLines drawing={drawing} view={view} litRow={lit} textOf={textOf} isCompact={isCompact} />
        {!isCompact && <Words drawing={drawing} view={view} />}
        {row?.mark && <LitMark from={seenPoint(row.mark.from, side)} to={seenPoint(row.mark.to, side)} view={view} text={showLength(row.value, units)} />}
        {!isCompact && <Rulers view={view} frame={frame} box={blankBox(carton, side)} units={units} />}
        {findings.map((finding, i) => finding.at && <Triangle key={i} number={i + 1} at={toStage(view, seenPoint(finding.at, side))} />)}
      </svg>
      <Figures drawing={drawing} view={view} isCompact={isCompact} textOf={textOf} />
    </>
  );
}

/** The numbered place of a finding. */
function Triangle({ number, at }: { number: number; at: { x: number; y: number } }) {
  return (
    <g transform={`translate(${at.x.toFixed(1)} ${at.y.toFixed(1)})`}>
      <path d="M0-12 13 10H-13Z" fill="var(--paper)" stroke="var(--ink)" strokeWidth={1.5} />
      <text y={6} textAnchor="middle" fontSize={11} fontWeight={700} fill="var(--ink)">{number}</text>
    </g>
  );
}

function useFrame(ref: React.RefObject<HTMLElement | null>): Frame | null {
  const [frame, setFrame] = useState<Frame | null>(null);
  useLayoutEffect(() => {
    const element = ref.current;
    if (!element) return;
    const measure = () => setFrame({ width: element.clientWidth, height: element.clientHeight });
    measure();
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    return () => observer.disconnect();
  }, [ref]);
  return frame;
}

/** The fitting view; while a drag or a held key goes on it stays, so that the drawing does not swim under the hand. */
function useFit(frame: Frame | null, side: Side, isCompact: boolean): View | null {
  const { session } = useBench();
  const { carton, gesture } = session;
  const held = useRef<View | null>(null);
  return useMemo(() => {
    if (!frame || frame.width === 0) return null;
    if (gesture !== null && held.current) return held.current;
    held.current = fitDrawing(carton, side, frame, isCompact ? COMPACT : WIDE, isCompact);
    return held.current;
  }, [frame, carton, gesture, side, isCompact]);
}
