// The page on which one carton is worked: strip, stage, lever, Ledger. It lays out and passes on; it knows no geometry.
import { lazy, type ReactNode, Suspense, useCallback, useEffect, useMemo, useRef, useState } from "react";
import { flushSync } from "react-dom";
import { Button, Switch } from "~/components/button";
import { classNames } from "~/components/class-names";
import { Icon } from "~/components/icon";
import { usePreferences } from "~/components/preferences";
import { useHydrated } from "~/components/use-hydrated";
import type { Board } from "~/cartons/boards/board";
import type { ConstructionInfo, LayerName } from "~/cartons/types";
import { type BenchActions, BenchProvider, type BenchState, type Lit, type Side } from "./bench-context";
import { FindingLine } from "./finding-line";
import { FoldLever } from "./fold-lever";
import { HelpDialog } from "./help-dialog";
import { Leader } from "./leader";
import { createLever, type Lever, useLever } from "./lever";
import { type PanelName, SidePanel } from "./side-panel";
import { withBasis, withConstruction, withDefault, withValue, type Session } from "./session";
import { PhoneStrip } from "./phone-strip";
import { SizesLine } from "./sizes-line";
import { Legend } from "./stage/legend";
import { Stage } from "./stage/stage";
import type { PanZoom } from "./stage/use-pan-zoom";
import { useBenchKeys } from "./use-bench-keys";
import { useFoldMotion } from "./use-fold-motion";
import { useNarrow } from "./use-narrow";
import { builderFor, useSession } from "./use-session";
import { isTrueSize, scaleWords, type View } from "./view";

const FoldStage = lazy(() => import("./fold-stage"));

export interface BenchProps {
  opened: Session;
  boards: readonly Board[];
  constructions: readonly ConstructionInfo[];
  name: string;
  canEdit: boolean;
  /** What stands in the strip above: name, saving, export. Rendered inside the Bench, so that it may ask it. */
  strip: (controls: { side: Side; openHelp: () => void }) => ReactNode;
}

const usuallyHidden: ReadonlySet<LayerName> = new Set(["safe"]);

export function Bench({ opened, boards, constructions, name, canEdit, strip }: BenchProps) {
  const [session, dispatch] = useSession(opened, boards);
  const { units } = usePreferences();
  const [side, setSide] = useState<Side>("inside");
  const [hidden, setHidden] = useState<ReadonlySet<LayerName>>(usuallyHidden);
  const [lit, setLit] = useState<Lit | null>(null);
  const [litPanels, setLitPanels] = useState<readonly string[]>([]);
  const [typed, setTyped] = useState<string | null>(null);
  const [panel, setPanel] = useState<PanelName>("ledger");
  const [isDrawerOpen, setDrawerOpen] = useState(false);
  const [isHelpOpen, setHelpOpen] = useState(false);
  const [scale, setScale] = useState<number | null>(null);
  const zoom = useRef<PanZoom | null>(null);
  const [lever] = useState(createLever);
  const motion = useFoldMotion(lever, session.carton.fold);
  const width = useNarrow();
  const isCompact = width === "phone";
  const isHydrated = useHydrated();

  const latest = useRef(session);
  latest.current = session;
  const actions = useMemo((): BenchActions => {
    const build = builderFor(boards);
    return {
      // Painted in the frame in which it was asked for: the drag waits for nothing else.
      set: (parameter, value, text, gesture) => flushSync(() => dispatch({ type: "edit", change: (brief) => withValue(brief, parameter, value, text), gesture })),
      endGesture: () => dispatch({ type: "end-gesture" }),
      wouldRefuse(parameter, value) {
        const result = build(withValue(latest.current.asked, parameter, value));
        return !result.ok && result.refusals.some((r) => r.parameter === parameter);
      },
      reset: (option) => dispatch({ type: "edit", change: (brief) => withDefault(brief, option) }),
      setBasis: (basis) => dispatch({ type: "edit", change: (brief) => withBasis(brief, basis) }),
      setConstruction: (construction) => dispatch({ type: "edit", change: (brief) => withConstruction(brief, construction) }),
      replace: (brief) => dispatch({ type: "replace", brief }),
      undo: () => dispatch({ type: "undo" }),
      redo: () => dispatch({ type: "redo" }),
      light: setLit,
      lightPanels: setLitPanels,
      typing: setTyped,
    };
  }, [boards, dispatch]);

  const bench = useMemo((): BenchState => ({ ...actions, session, units, lit, litPanels, typed, boards, canEdit }), [actions, session, units, lit, litPanels, typed, boards, canEdit]);
  const { findings } = session.carton;
  const openPanel = useCallback((next: PanelName) => {
    setPanel(next);
    setDrawerOpen(true);
  }, []);
  useBenchKeys({ actions, lever, motion, fold: session.carton.fold, zoom, flip: () => setSide((s) => (s === "inside" ? "print" : "inside")), openHelp: () => setHelpOpen(true), openPanel });
  const view = useRef<View | null>(null);
  const onView = useCallback((next: View, controls: PanZoom) => {
    zoom.current = controls;
    view.current = next;
    setScale(next.scale);
  }, []);
  const toggleLayer = (layer: LayerName) => setHidden((before) => new Set(before.has(layer) ? [...before].filter((l) => l !== layer) : [...before, layer]));

  return (
    <BenchProvider value={bench}>
      <div className="flex min-h-dvh flex-col md:h-dvh md:overflow-hidden">
        {strip({ side, openHelp: () => setHelpOpen(true) })}
        <main id="content" tabIndex={-1} data-ready={isHydrated} className="relative flex min-h-0 flex-1 outline-none max-md:flex-col">
          <h1 className="sr-only">{name}, on the Bench</h1>
          <div className="flex min-h-0 min-w-0 flex-1 flex-col">
            <div className="flex flex-wrap items-start justify-between gap-x-6 gap-y-2 px-4 pb-2 pt-3 md:pl-8 md:pr-5">
              <FindingLine findings={findings} onOpenCheck={() => openPanel("check")} />
              <StageTools {...{ side, setSide, scale, zoom, isCompact, lever }} onOpenPanel={() => setDrawerOpen((is) => !is)} isDrawerOpen={isDrawerOpen} />
              {!isCompact && <SizesLine carton={session.carton} units={units} className="w-full pl-7" />}
            </div>
            <div className="relative min-h-0 flex-1 max-md:h-[72vw] max-md:min-h-64 max-md:flex-none">
              <StageOrFold lever={lever} fold={(onReady) => <FoldStage lever={lever} drawing={view} onReady={onReady} />}>
                <Stage side={side} hidden={hidden} isCompact={isCompact} findings={findings} onView={onView} className="absolute inset-0" />
              </StageOrFold>
            </div>
            {!isCompact && <Legend carton={session.carton} hidden={hidden} onToggle={toggleLayer} units={units} className="px-8 pb-2 pt-1" />}
            {isCompact && <PhoneStrip scale={scale} legend={<Legend carton={session.carton} hidden={hidden} onToggle={toggleLayer} units={units} />} />}
            {!isCompact && <FoldLever carton={session.carton} lever={lever} motion={motion} isCompact={false} />}
          </div>
          <aside
            aria-label="Figures and checks"
            className={classNames(
              "flex min-h-0 flex-col border-ink bg-paper md:border-l",
              width === "wide" && "w-[380px]",
              width === "drawer" && "drawer absolute inset-y-0 right-0 z-20 w-80",
              width === "drawer" && !isDrawerOpen && "hidden",
            )}
          >
            <SidePanel {...{ panel, setPanel, findings, constructions, name }} onClose={width === "drawer" ? () => setDrawerOpen(false) : undefined} />
          </aside>
          {isCompact && <FoldLever carton={session.carton} lever={lever} motion={motion} isCompact />}
          {width === "wide" && <Leader lit={lit} panel={panel} />}
        </main>
      </div>
      <HelpDialog isOpen={isHelpOpen} onClose={() => setHelpOpen(false)} />
    </BenchProvider>
  );
}

/** Flat, the stage is the drawing; with the lever off its stop it is the folding carton, fetched on first use. */
function StageOrFold({ lever, fold, children }: { lever: Lever; fold: (onReady: () => void) => ReactNode; children: ReactNode }) {
  const isFolding = useLever(lever) > 0;
  const [wasTouched, setTouched] = useState(false);
  const [isReady, setReady] = useState(false);
  const onReady = useCallback(() => setReady(true), []);
  useEffect(() => {
    if (isFolding) setTouched(true);
  }, [isFolding]);
  return (
    <>
      <div className={isFolding && isReady ? "invisible" : undefined}>{children}</div>
      {(isFolding || wasTouched) && (
        <div className={classNames("absolute inset-0", !(isFolding && isReady) && "invisible")}>
          <Suspense fallback={null}>{fold(onReady)}</Suspense>
        </div>
      )}
      {isFolding && !isReady && <p role="status" className="absolute bottom-2 left-8 bg-paper text-small text-ink-2">Fetching the folding stage …</p>}
    </>
  );
}

function StageTools({ side, setSide, scale, zoom, isCompact, lever, onOpenPanel, isDrawerOpen }: { side: Side; setSide: (side: Side) => void; scale: number | null; zoom: { current: PanZoom | null }; isCompact: boolean; lever: Lever; onOpenPanel: () => void; isDrawerOpen: boolean }) {
  const isFolding = useLever(lever) > 0;
  const width = useNarrow();
  const drawer = width === "drawer" && (
    <Button size="small" onClick={onOpenPanel} aria-expanded={isDrawerOpen}>Ledger</Button>
  );
  if (isCompact) return null;
  if (isFolding) return <div className="flex min-h-8 items-center gap-4 text-small text-ink-2">Drag or use the arrow keys to turn it {drawer}</div>;
  return (
    <div className="flex items-center gap-4">
      <Switch label="Side" value={side} onChange={setSide} choices={[{ value: "inside", label: "Inside up" }, { value: "print", label: "Print side up" }]} />
      <div className="flex items-center text-small">
        <ZoomButton glyph="minus" label="Smaller" onClick={() => zoom.current?.zoom(1 / 1.25)} />
        <button type="button" onClick={() => zoom.current?.trueSize()} title="Show at true size" className="min-h-7 min-w-16 px-1 hover:text-live">
          {scale === null ? "" : <><b>{scaleWords(scale)}</b>{isTrueSize(scale) && " true size"}</>}
        </button>
        <ZoomButton glyph="plus" label="Larger" onClick={() => zoom.current?.zoom(1.25)} />
        <ZoomButton glyph="fit" label="Fit the stage" onClick={() => zoom.current?.fit()} />
      </div>
      {drawer}
    </div>
  );
}

function ZoomButton({ glyph, label, onClick }: { glyph: "plus" | "minus" | "fit"; label: string; onClick: () => void }) {
  return (
    <button type="button" aria-label={label} title={label} onClick={onClick} className="inline-flex size-7 items-center justify-center hover:text-live">
      <Icon name={glyph} size={14} />
    </button>
  );
}
