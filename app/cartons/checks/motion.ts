// The way from flat to closed, sampled. Rigid boards cannot flex, so what a person passes by flexing is declared; the rest is an error.
import type { Blank } from "../blank/blank";
import { poseAt } from "../fold/pose";
import type { Finding, FoldModel } from "../types";
import { meetingsIn } from "./collisions";
import { platesOf } from "./solids";

export interface MotionReport {
  /** Pairs that meet on the way: in which step, between which parts of it, and whether that is declared. */
  readonly meetings: readonly { readonly panels: readonly [string, string]; readonly step: string; readonly from: number; readonly to: number; readonly because: string | null }[];
  readonly findings: readonly Finding[];
}

/** `samples` poses a step, the end of each step included. */
export function checkMotion(blank: Blank, fold: FoldModel, samples = 6): MotionReport {
  const met = new Map<string, { panels: readonly [string, string]; step: string; from: number; to: number; because: string | null }>();
  fold.steps.forEach((step, index) => {
    for (let k = 1; k <= samples; k++) {
      const part = k / samples;
      const pose = poseAt(fold, index + part);
      for (const meeting of meetingsIn(blank, pose, platesOf(fold, pose), false)) {
        const key = `${meeting.panels.join("|")}|${step.id}`;
        const known = met.get(key);
        if (known) known.to = part;
        else {
          const declared = blank.transients.find((t) => t.panels.every((p) => meeting.panels.includes(p)) && t.steps.includes(step.id));
          met.set(key, { panels: meeting.panels, step: step.id, from: part, to: part, because: declared?.because ?? null });
        }
      }
    }
  });
  const meetings = [...met.values()];
  const findings = meetings.filter((m) => m.because === null).map((m): Finding => ({
    code: "collision-on-the-way", severity: "error", panels: m.panels, at: null, measured: m.from, required: null,
    facts: { a: m.panels[0], b: m.panels[1], step: m.step }, mend: null,
  }));
  return { meetings, findings };
}
