// A length as people type it: sums, units, a comma or a point. What it comes to stands beside it, what is wrong below.
import { type ReactNode, useEffect, useRef, useState } from "react";
import { classNames } from "./class-names";
import { controlClasses, edgeClasses, Field } from "./field";
import type { UnitName } from "./preferences";
import { expressionToKeep, readFigure, showLength, withUnit } from "~/bench/lengths";

export interface LengthFieldProps {
  label: string;
  /** mm */
  value: number;
  /** What was typed for it when that was more than a number. */
  typed?: string;
  units: UnitName;
  onChange: (mm: number, typed: string | undefined) => void;
  /** Told when the text stops being a length, and when it is one again. */
  onReadable?: (isReadable: boolean) => void;
  error?: ReactNode;
  mend?: ReactNode;
  hint?: ReactNode;
  className?: string;
}

export function LengthField({ label, value, typed, units, onChange, onReadable, error, mend, hint, className }: LengthFieldProps) {
  const written = typed ?? showLength(value, units);
  const [text, setText] = useState(written);
  const [isLeft, setLeft] = useState(false);
  const told = useRef(value);
  const reading = readFigure(text, "length", units);

  // Changed from elsewhere (a mend, other units): the text follows; not while it says the same already.
  useEffect(() => {
    const now = readFigure(text, "length", units);
    if (value !== told.current || (now.ok && Math.abs(now.value - value) > 1e-6)) {
      told.current = value;
      setText(written);
    }
    // Only what comes from outside.
  }, [value, typed, units]);

  const change = (next: string) => {
    setText(next);
    setLeft(false);
    const now = readFigure(next, "length", units);
    onReadable?.(now.ok);
    if (!now.ok) return;
    told.current = now.value;
    onChange(now.value, expressionToKeep(next, "length", units));
  };
  const wrong = !reading.ok && isLeft ? reading.sentence : reading.ok ? error : undefined;
  const comesTo = reading.ok && expressionToKeep(text, "length", units) !== undefined ? `= ${withUnit(reading.value, "length", units)}` : null;
  return (
    <Field label={label} error={wrong} mend={reading.ok ? mend : undefined} hint={hint} className={className}>
      {(ids) => (
        <span className="relative block">
          <input
            type="text"
            {...ids}
            value={text}
            autoComplete="off"
            spellCheck={false}
            onChange={(event) => change(event.target.value)}
            onBlur={() => setLeft(true)}
            className={classNames(controlClasses, edgeClasses(Boolean(wrong)), comesTo ? "pr-24" : "pr-10")}
          />
          <span className="pointer-events-none absolute inset-y-0 right-3 flex items-center text-small text-ink-2">{comesTo ?? units}</span>
        </span>
      )}
    </Field>
  );
}
