// The fold view: the same blank in 3-D, turned by hand. Fetched when the lever first moves; the only door to three.
import { Canvas } from "@react-three/fiber";
import { Component, useMemo, useRef, useState, type KeyboardEvent, type PointerEvent, type ReactNode, type WheelEvent } from "react";
import type { Carton } from "~/cartons/types";
import { AT_REST, type Turn } from "./camera";
import { FoldedPicture } from "./folded-picture";
import { useColours } from "./three/colours";
import { FoldingCarton } from "./three/folding-carton";
import type { View } from "./view";

export interface FoldViewProps {
  readonly carton: Carton;
  /** 0 flat to the number of steps, closed. */
  readonly u: number;
  /** Where the drawing lies on the stage, so that the lift begins where the drawing was. */
  readonly drawing: View;
  readonly litPanels?: readonly string[];
  readonly onHoverPanel?: (panel: string | null) => void;
  /** What a screen reader says. */
  readonly label: string;
}

/** Degrees a pixel dragged, and a press of an arrow key. */
const PER_PIXEL = 0.45;
const PER_KEY = 5;
const ZOOM_KEY = 1.15;

export function FoldView({ carton, u, drawing, litPanels = [], onHoverPanel, label }: FoldViewProps) {
  const colours = useColours();
  const [turn, setTurn] = useState<Turn>(AT_REST);
  const [seeThrough, setSeeThrough] = useState(false);
  const [isReady, setReady] = useState(false);
  const grip = useRef<{ x: number; y: number } | null>(null);
  const lit = useMemo(() => new Set(litPanels), [litPanels]);
  const turnBy = (azimuth: number, elevation: number, zoom = 1) =>
    setTurn((t) => ({ azimuth: t.azimuth + azimuth, elevation: Math.min(63, Math.max(-115, t.elevation + elevation)), zoom: Math.min(12, Math.max(0.2, t.zoom * zoom)) }));

  const down = (event: PointerEvent<HTMLDivElement>) => {
    grip.current = { x: event.clientX, y: event.clientY };
    event.currentTarget.setPointerCapture(event.pointerId);
  };
  const move = (event: PointerEvent<HTMLDivElement>) => {
    if (!grip.current) return;
    turnBy(-(event.clientX - grip.current.x) * PER_PIXEL, (event.clientY - grip.current.y) * PER_PIXEL);
    grip.current = { x: event.clientX, y: event.clientY };
  };
  const keys = (event: KeyboardEvent) => {
    const acts: Record<string, () => void> = {
      ArrowLeft: () => turnBy(PER_KEY, 0), ArrowRight: () => turnBy(-PER_KEY, 0), ArrowUp: () => turnBy(0, PER_KEY), ArrowDown: () => turnBy(0, -PER_KEY),
      "+": () => turnBy(0, 0, ZOOM_KEY), "=": () => turnBy(0, 0, ZOOM_KEY), "-": () => turnBy(0, 0, 1 / ZOOM_KEY), "0": () => setTurn(AT_REST),
    };
    const act = acts[event.key];
    if (!act || event.ctrlKey || event.metaKey || event.altKey) return;
    event.preventDefault();
    // The lever listens for the same keys further out.
    event.stopPropagation();
    act();
  };

  return (
    <div className="absolute inset-0">
      <div
        role="application" aria-roledescription="folded carton" aria-label={label} tabIndex={0} data-fold-view data-ready={isReady} data-u={u.toFixed(3)}
        className="absolute inset-0 cursor-grab touch-none active:cursor-grabbing" onPointerDown={down} onPointerMove={move} onPointerUp={() => { grip.current = null; }}
        onPointerCancel={() => { grip.current = null; }} onDoubleClick={() => setTurn(AT_REST)} onKeyDown={keys}
        onWheel={(event: WheelEvent) => turnBy(0, 0, Math.exp(-event.deltaY / 700))}
      >
        <WithoutGraphics carton={carton} u={u}>
          <Canvas orthographic frameloop="demand" flat dpr={[1, 2]} gl={{ antialias: true, alpha: true, preserveDrawingBuffer: true }} onCreated={() => setReady(true)}>
            <FoldingCarton carton={carton} u={u} turn={turn} drawing={drawing} colours={colours} lit={lit} seeThrough={seeThrough} onHover={(panel) => onHoverPanel?.(panel)} />
          </Canvas>
        </WithoutGraphics>
      </div>
      <div className="absolute right-5 bottom-4 flex items-center gap-4 text-small text-ink-2">
        <button type="button" aria-pressed={seeThrough} onClick={() => setSeeThrough(!seeThrough)} className="min-h-6 underline underline-offset-2 aria-pressed:font-bold aria-pressed:text-ink max-sm:min-h-11">Look inside</button>
        <button type="button" onClick={() => setTurn(AT_REST)} className="min-h-6 underline underline-offset-2 max-sm:min-h-11">Turn back</button>
      </div>
    </div>
  );
}

/** Where the browser has no 3-D graphics, the drawn picture of the same pose stands in. */
class WithoutGraphics extends Component<{ carton: Carton; u: number; children: ReactNode }, { failed: boolean }> {
  override state = { failed: false };
  static getDerivedStateFromError = () => ({ failed: true });
  override render() {
    if (!this.state.failed) return this.props.children;
    return (
      <div className="flex h-full flex-col items-center justify-center gap-3">
        <FoldedPicture carton={this.props.carton} u={this.props.u} width={520} height={420} title="The carton as it is folded now" />
        <p className="text-small text-ink-2">This browser shows no 3-D graphics; the picture follows the lever and does not turn.</p>
      </div>
    );
  }
}
