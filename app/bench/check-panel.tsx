// The fold check: the blank was folded as thick board; this is what came of it. Pointing at a sentence lights its panels.
import type { ReactNode } from "react";
import { classNames } from "~/components/class-names";
import { Icon, type IconName } from "~/components/icon";
import { findingSentence } from "~/copy/findings";
import { axisSentence, axisWords, collisionSentence, lockSentence, mateSentence, toleranceSentence, toleranceTerms } from "~/copy/fold-check";
import type { Axis, Finding } from "~/cartons/types";
import { useBench } from "./bench-context";
import { withUnit } from "./lengths";
import { MendFinding } from "./mend-button";

const axes: readonly Axis[] = ["L", "W", "D"];

export function CheckPanel({ findings }: { findings: readonly Finding[] }) {
  const { session, units } = useBench();
  const { carton } = session;
  const { foldCheck } = carton;
  const format = (mm: number) => withUnit(mm, "length", units);
  const labelOf = (name: string) => {
    const label = carton.panels.find((panel) => panel.name === name)?.label ?? name;
    return carton.panels.filter((panel) => panel.label === label).length > 1 ? name : label;
  };
  return (
    <div className="pb-6">
      <Group title={findings.length === 0 ? "Nothing to mend" : findings.length === 1 ? "One thing to look at" : `${findings.length} things to look at`}>
        {findings.length === 0 && <Line glyph="tick">The checks of folding and of making found nothing.</Line>}
        {findings.map((finding, i) => <FindingLine key={i} finding={finding} number={i + 1} />)}
      </Group>
      <Group title="Measured on the folded carton">
        {axes.map((axis) => {
          const stack = foldCheck.tolerance.find((t) => t.axis === axis);
          const isTrue = Math.abs(foldCheck.measuredInside[axis] - carton.inside[axis]) <= 0.05;
          return (
            <Line key={axis} glyph={isTrue ? "tick" : "warning"}>
              <b>{axisWords[axis]}.</b> {axisSentence(carton, axis, format)}
              {stack && (
                <>
                  {" "}{toleranceSentence(stack, format)}
                  {stack.terms.length > 0 && <span className="block text-label text-ink-3">{toleranceTerms(stack, format)}</span>}
                </>
              )}
            </Line>
          );
        })}
        <Line glyph={foldCheck.collisions.some((c) => c.depth > c.allowed) ? "warning" : "tick"} panels={foldCheck.collisions.filter((c) => c.depth > c.allowed).flatMap((c) => c.panels)}>
          {collisionSentence(carton, labelOf, format)}
        </Line>
      </Group>
      {foldCheck.locks.length > 0 && (
        <Group title="Locks">
          {foldCheck.locks.map((lock, i) => <Line key={i} glyph={lock.ok ? "tick" : "warning"} panels={lock.panels}>{lockSentence(lock, format)}</Line>)}
        </Group>
      )}
      {foldCheck.mates.length > 0 && (
        <Group title="Faces that meet">
          {foldCheck.mates.map((mate, i) => <Line key={i} glyph={mate.ok ? "tick" : "warning"} panels={mate.panels}>{mateSentence(mate, labelOf, format)}</Line>)}
        </Group>
      )}
      <p className="px-5 pt-3 text-small text-ink-2">Calculated, not guaranteed: cut and fold a sample first.</p>
    </div>
  );
}

function Group({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="pb-2">
      <h3 className="mx-5 border-b-2 border-ink pb-1 pt-4 text-small font-bold">{title}</h3>
      <ul>{children}</ul>
    </section>
  );
}

function Line({ glyph, panels, children }: { glyph: IconName; panels?: readonly string[]; children: ReactNode }) {
  const { lightPanels } = useBench();
  const canLight = Boolean(panels && panels.length > 0);
  const on = () => panels && lightPanels(panels);
  const off = () => lightPanels([]);
  return (
    <li
      tabIndex={canLight ? 0 : undefined}
      onPointerEnter={canLight ? on : undefined}
      onPointerLeave={canLight ? off : undefined}
      onFocus={canLight ? on : undefined}
      onBlur={canLight ? off : undefined}
      className={classNames("flex items-start gap-3 px-5 py-1.5 text-[14px] leading-5 outline-offset-[-2px]", canLight && "hover:bg-wash focus-visible:bg-wash")}
    >
      <Icon name={glyph} size={14} className="mt-[3px] text-ink-2" />
      <div className="min-w-0 flex-1 border-b border-rule pb-1.5">{children}</div>
    </li>
  );
}

function FindingLine({ finding, number }: { finding: Finding; number: number }) {
  const { units } = useBench();
  return (
    <Line glyph={finding.severity === "error" ? "stop" : finding.severity === "warning" ? "warning" : "note"} panels={finding.panels}>
      <b>{number}.</b> {findingSentence(finding, (mm) => withUnit(mm, "length", units))} <MendFinding finding={finding} />
    </Line>
  );
}
