// Wheel and pinch zoom at the pointer, drag moves, keys do both. Until somebody moves it the drawing fits the stage by itself.
import { type KeyboardEvent, type PointerEvent, type RefObject, useCallback, useEffect, useRef, useState } from "react";
import type { Point } from "~/cartons/geometry/outline";
import { panned, TRUE_SCALE, type View, zoomedAt } from "../view";

const PAN_KEYS: Readonly<Record<string, readonly [number, number]>> = { ArrowLeft: [48, 0], ArrowRight: [-48, 0], ArrowUp: [0, 48], ArrowDown: [0, -48] };

export interface PanZoom {
  /** Null while the drawing fits by itself. */
  readonly own: View | null;
  zoom(factor: number): void;
  fit(): void;
  trueSize(): void;
  handlers: {
    onPointerDown(event: PointerEvent): void;
    onPointerMove(event: PointerEvent): void;
    onPointerUp(event: PointerEvent): void;
    onPointerCancel(event: PointerEvent): void;
    onKeyDown(event: KeyboardEvent): void;
  };
}

export function usePanZoom(stage: RefObject<HTMLElement | null>, current: RefObject<View | null>): PanZoom {
  const [own, setOwn] = useState<View | null>(null);
  const pointers = useRef(new Map<number, Point>());
  const placeOf = useCallback((event: { clientX: number; clientY: number }): Point => {
    const box = stage.current?.getBoundingClientRect();
    return { x: event.clientX - (box?.left ?? 0), y: event.clientY - (box?.top ?? 0) };
  }, [stage]);
  const change = useCallback((next: (view: View) => View) => {
    setOwn((before) => {
      const from = before ?? current.current;
      return from ? next(from) : before;
    });
  }, [current]);
  const middle = useCallback((): Point => {
    const box = stage.current?.getBoundingClientRect();
    return { x: (box?.width ?? 0) / 2, y: (box?.height ?? 0) / 2 };
  }, [stage]);
  const zoom = useCallback((factor: number) => change((view) => zoomedAt(view, factor, middle())), [change, middle]);
  const trueSize = useCallback(() => change((view) => zoomedAt(view, TRUE_SCALE / view.scale, middle())), [change, middle]);
  const fit = useCallback(() => setOwn(null), []);

  useEffect(() => {
    const element = stage.current;
    if (!element) return;
    // Not through React: it listens passively, and the page must not scroll under the drawing.
    const onWheel = (event: WheelEvent) => {
      event.preventDefault();
      const lines = event.deltaMode === WheelEvent.DOM_DELTA_LINE ? 16 : 1;
      if (event.shiftKey) change((view) => panned(view, -event.deltaY * lines, 0));
      else change((view) => zoomedAt(view, Math.exp(-event.deltaY * lines * 0.0018), placeOf(event)));
    };
    element.addEventListener("wheel", onWheel, { passive: false });
    return () => element.removeEventListener("wheel", onWheel);
  }, [stage, change, placeOf]);

  const end = (event: PointerEvent) => void pointers.current.delete(event.pointerId);
  return {
    own, zoom, fit, trueSize,
    handlers: {
      onPointerDown(event) {
        if (event.button > 1) return;
        // One finger scrolls the page until the drawing has been zoomed.
        if (event.pointerType === "touch" && own === null && pointers.current.size === 0) {
          pointers.current.set(event.pointerId, placeOf(event));
          return;
        }
        event.currentTarget.setPointerCapture(event.pointerId);
        pointers.current.set(event.pointerId, placeOf(event));
      },
      onPointerMove(event) {
        const before = pointers.current.get(event.pointerId);
        if (!before) return;
        const now = placeOf(event);
        const others = [...pointers.current].filter(([id]) => id !== event.pointerId).map(([, at]) => at);
        pointers.current.set(event.pointerId, now);
        const other = others[0];
        if (other) {
          const was = Math.hypot(before.x - other.x, before.y - other.y);
          const is = Math.hypot(now.x - other.x, now.y - other.y);
          const between = { x: (now.x + other.x) / 2, y: (now.y + other.y) / 2 };
          if (was > 0) change((view) => panned(zoomedAt(view, is / was, between), (now.x - before.x) / 2, (now.y - before.y) / 2));
        } else if (event.pointerType !== "touch" || own !== null) {
          change((view) => panned(view, now.x - before.x, now.y - before.y));
        }
      },
      onPointerUp: end,
      onPointerCancel: end,
      onKeyDown(event) {
        if (event.target !== event.currentTarget || event.ctrlKey || event.metaKey) return;
        const pan = PAN_KEYS[event.key];
        if (!pan) return;
        event.preventDefault();
        event.stopPropagation();
        change((view) => panned(view, pan[0], pan[1]));
      },
    },
  };
}
