import { memo } from "react";
import type { Box } from "~/cartons/geometry/outline";
import type { UnitName } from "~/components/preferences";
import { type Frame, rulerStep, toStage, type View } from "../view";

const SIZE = 18;

/** Along the top and the left edge, counted from the blank's upper left corner. */
export const Rulers = memo(function Rulers({ view, frame, box, units }: { view: View; frame: Frame; box: Box; units: UnitName }) {
  const one = units === "mm" ? 1 : 25.4;
  const step = rulerStep(view.scale * one, 64) * one;
  const origin = toStage(view, { x: box.minX, y: box.maxY });
  const marks = (start: number, length: number) => {
    const px = step * view.scale;
    const first = Math.ceil(-start / (px / 2));
    const last = Math.floor((length - start) / (px / 2));
    return Array.from({ length: Math.max(0, last - first + 1) }, (_, i) => first + i).map((n) => ({ n, at: start + (n * px) / 2, text: n % 2 === 0 ? String(Number(((n / 2) * (step / one)).toFixed(3))) : null }));
  };
  return (
    <g stroke="var(--rule-2)" fill="var(--ink-3)" fontSize={11} aria-hidden>
      {marks(origin.x, frame.width).map(({ n, at, text }) => (
        <g key={`x${n}`}>
          <path d={`M${at.toFixed(1)} 0V${text === null ? 5 : 9}`} strokeWidth={1} />
          {text !== null && at > SIZE && <text x={at + 4} y={10} stroke="none">{text}</text>}
        </g>
      ))}
      {marks(origin.y, frame.height).map(({ n, at, text }) => (
        <g key={`y${n}`}>
          <path d={`M0 ${at.toFixed(1)}H${text === null ? 5 : 9}`} strokeWidth={1} />
          {text !== null && at > SIZE && <text x={12} y={at + 4} stroke="none">{text}</text>}
        </g>
      ))}
    </g>
  );
});
