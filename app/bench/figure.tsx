// A figure that is a field: press it and type over it, drag it left or right, or step it with the arrow keys.
import { type KeyboardEvent, type PointerEvent, useEffect, useId, useRef, useState } from "react";
import { classNames } from "~/components/class-names";
import { Icon } from "~/components/icon";
import { useBench, refusalOf } from "./bench-context";
import { expressionToKeep, type FigureKind, readFigure, showFigure, stepOf, withUnit } from "./lengths";
import { MendButton } from "./mend-button";
import { refusalWords } from "./refusal-words";
import { askedValue } from "./session";

export interface FigureProps {
  parameter: string;
  /** "Length", "Glue flap": for the screen reader and the field. */
  label: string;
  kind: FigureKind;
  look: "drawing" | "row" | "strip";
  /** Row of the Ledger that it lights. */
  row?: string;
  className?: string;
  /** Written along a vertical line. */
  vertical?: boolean;
}

/** Pixels of a drag that make one step, and that tell a drag from a press. */
const DRAG_STEP = 5;
const DRAG_STARTS = 4;

export function Figure({ parameter, label, kind, look, row, className, vertical }: FigureProps) {
  const bench = useBench();
  const { session, units, canEdit } = bench;
  const [isOpen, setOpen] = useState(false);
  const button = useRef<HTMLButtonElement>(null);
  const drag = useRef<{ x: number; value: number; moved: boolean; frame: number; next: number } | null>(null);
  const value = Number(askedValue(session, parameter));
  const refusal = refusalOf(session, parameter);
  const text = showFigure(value, kind, units);
  const light = () => row && bench.light({ row, from: look === "drawing" ? "stage" : look === "row" ? "ledger" : "strip" });

  const step = (by: number, event: { shiftKey: boolean; altKey: boolean }, from = value) => stepOf(from, by, kind, units, event.shiftKey ? 10 : event.altKey ? 0.1 : 1);

  function onKeyDown(event: KeyboardEvent) {
    const by = event.key === "ArrowUp" || event.key === "ArrowRight" ? 1 : event.key === "ArrowDown" || event.key === "ArrowLeft" ? -1 : 0;
    if (by === 0 || event.ctrlKey || event.metaKey) return;
    event.preventDefault();
    event.stopPropagation();
    bench.set(parameter, step(by, event), undefined, `keys:${parameter}`);
  }

  function onPointerDown(event: PointerEvent<HTMLButtonElement>) {
    if (event.button !== 0 || event.pointerType === "touch") return;
    event.stopPropagation();
    event.currentTarget.setPointerCapture(event.pointerId);
    drag.current = { x: event.clientX, value, moved: false, frame: 0, next: value };
  }

  function onPointerMove(event: PointerEvent) {
    const at = drag.current;
    if (!at) return;
    const way = event.clientX - at.x;
    if (!at.moved && Math.abs(way) < DRAG_STARTS) return;
    at.moved = true;
    at.next = step(Math.trunc(way / DRAG_STEP), event, at.value);
    // One rebuild a frame, however often the pointer reports.
    if (at.frame) return;
    at.frame = requestAnimationFrame(() => {
      at.frame = 0;
      bench.set(parameter, at.next, undefined, `drag:${parameter}`);
    });
  }

  function onPointerUp() {
    const at = drag.current;
    drag.current = null;
    if (!at?.moved) return;
    if (at.frame) cancelAnimationFrame(at.frame);
    bench.set(parameter, at.next, undefined, `drag:${parameter}`);
    bench.endGesture();
    // The press that ends a drag is no press.
    justDragged.current = true;
    setTimeout(() => (justDragged.current = false), 0);
  }
  const justDragged = useRef(false);

  if (isOpen) {
    return (
      <OpenFigure
        {...{ parameter, label, kind, look, value }}
        onClose={(how) => {
          setOpen(false);
          if (how === "key") requestAnimationFrame(() => button.current?.focus());
        }}
      />
    );
  }
  if (!canEdit) return <span className={classNames("inline-block", look === "strip" ? "text-h2 font-black" : "text-figure font-bold", className)}>{text}</span>;
  return (
    <button
      ref={button}
      type="button"
      aria-label={`${label} ${withUnit(value, kind, units)}${refusal ? ", refused" : ""}. Change it`}
      title="Click to type, drag to change"
      onClick={() => !justDragged.current && setOpen(true)}
      onKeyDown={onKeyDown}
      onKeyUp={(event) => event.key.startsWith("Arrow") && bench.endGesture()}
      onPointerDown={onPointerDown}
      onPointerMove={onPointerMove}
      onPointerUp={onPointerUp}
      onPointerCancel={onPointerUp}
      onPointerEnter={light}
      onPointerLeave={() => row && bench.light(null)}
      onFocus={light}
      onBlur={() => row && bench.light(null)}
      className={classNames(
        "inline-flex min-h-6 min-w-6 cursor-ew-resize items-center justify-center font-bold underline decoration-[1.5px] underline-offset-4 hover:bg-wash hover:text-live",
        look === "strip" ? "min-h-11 text-[23px] leading-8 md:min-h-8" : "text-figure",
        look === "drawing" ? "px-1" : "justify-end max-md:min-h-11",
        refusal && "text-stop decoration-stop",
        vertical && "-rotate-90",
        className,
      )}
    >
      {text}
    </button>
  );
}

function OpenFigure({ parameter, label, kind, look, value, onClose }: Pick<FigureProps, "parameter" | "label" | "kind" | "look"> & { value: number; onClose: (how: "key" | "away") => void }) {
  const bench = useBench();
  const { session, units } = bench;
  const id = useId();
  const input = useRef<HTMLInputElement>(null);
  const before = useRef({ value, text: session.asked.typed[parameter] ?? showFigure(value, kind, units) });
  const [text, setText] = useState(before.current.text);
  const [isTried, setTried] = useState(false);
  const reading = readFigure(text, kind, units);
  const refusal = refusalOf(session, parameter);
  const isRefused = isTried && reading.ok && refusal !== undefined && Number(refusal.given) === reading.value;

  useEffect(() => {
    input.current?.focus();
    input.current?.select();
    return () => bench.typing(null);
    // Once, when it opens.
  }, []);
  const words = reading.ok ? withUnit(reading.value, kind, units) : null;
  // Tried and refused, the sentence at the top says so; until then it says what is being checked.
  useEffect(() => bench.typing(isRefused ? null : words ?? ""), [words, isRefused]);

  /** True when the field may close. */
  function commit(): boolean {
    setTried(true);
    if (!reading.ok) return false;
    if (text.trim() !== before.current.text.trim() || reading.value !== before.current.value) bench.set(parameter, reading.value, expressionToKeep(text, kind, units));
    return true;
  }

  function onKeyDown(event: KeyboardEvent) {
    event.stopPropagation();
    if (event.key === "Enter") {
      event.preventDefault();
      if (isRefused || (commit() && !willBeRefused())) onClose("key");
    } else if (event.key === "Escape") {
      event.preventDefault();
      if (isRefused) bench.set(parameter, before.current.value, before.current.text);
      onClose("key");
    }
  }
  const willBeRefused = () => reading.ok && bench.wouldRefuse(parameter, reading.value);

  const sentence = isTried && !reading.ok ? reading.sentence : isRefused && refusal ? refusalWords(refusal, session.asked.construction, units) : null;
  return (
    <span
      className={classNames("text-left", look === "strip" ? "absolute inset-x-3 bottom-1 z-10 block" : classNames("relative inline-block", look === "drawing" ? "z-20" : "z-10"))}
      onPointerDown={(event) => event.stopPropagation()}
      onBlur={(event) => {
        if (event.currentTarget.contains(event.relatedTarget)) return;
        if (reading.ok) commit();
        onClose("away");
      }}
    >
      <span className={classNames("flex h-9 items-center gap-2 rounded-control border-2 bg-board px-2 max-md:h-11", sentence ? "border-stop" : "border-live-line")}>
        <input
          ref={input}
          aria-label={label}
          aria-invalid={sentence ? true : undefined}
          aria-describedby={`${id}-words`}
          value={text}
          inputMode="text"
          autoComplete="off"
          spellCheck={false}
          onChange={(event) => {
            setText(event.target.value);
            setTried(false);
          }}
          onKeyDown={onKeyDown}
          className={classNames("bg-transparent text-figure font-bold outline-none", look === "strip" ? "min-w-0 flex-1" : "w-24")}
        />
        <span aria-live="polite" className="whitespace-nowrap pr-1 text-base text-ink-2">{words ? `= ${words}` : "= ?"}</span>
      </span>
      {/* On a phone the sentence of a refusal stands under the strip already. */}
      <span id={`${id}-words`} className={classNames("absolute top-full z-20 block bg-paper px-1.5 pb-1 pt-1 text-small", look === "strip" ? "inset-x-0" : "w-max max-w-64", look === "drawing" && "left-0", look === "row" && "right-0", look === "strip" && isRefused && "hidden")}>
        {sentence ? (
          <span role="alert" className="flex items-start gap-1.5 text-stop">
            <Icon name="stop" size={14} className="mt-0.5" />
            <span>
              {sentence} {isRefused && refusal && <MendButton parameter={parameter} refusal={refusal} onDone={() => onClose("key")} />}
            </span>
          </span>
        ) : (
          <span className="text-ink-2">Enter keeps it, Esc puts back {before.current.text}</span>
        )}
      </span>
    </span>
  );
}
