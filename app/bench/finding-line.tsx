// The sentence at the top of the stage: whether it folds shut, what is refused, what is being checked. The three never contradict.
import { Icon } from "~/components/icon";
import { findingSentence } from "~/copy/findings";
import { closesSentence } from "~/copy/fold-check";
import type { Finding } from "~/cartons/types";
import { useBench } from "./bench-context";
import { showSize, withUnit } from "./lengths";
import { MendButton, MendFinding } from "./mend-button";
import { refusalWords } from "./refusal-words";

export function FindingLine({ findings, onOpenCheck }: { findings: readonly Finding[]; onOpenCheck: () => void }) {
  const { session, units, typed } = useBench();
  const format = (mm: number) => withUnit(mm, "length", units);
  const [refusal, ...more] = session.refusals;
  const first = findings.find((f) => f.severity !== "note");
  return (
    <div className="min-w-0 flex-1">
      <p role="status" className="flex items-start gap-3 text-[17px] font-bold leading-6 md:text-finding">
        {typed !== null ? (
          <>
            <span className="mt-2.5 h-0.5 w-4 shrink-0 bg-live-line" aria-hidden />
            <span>{typed === "" ? "Type a figure." : `Checking ${typed} …`}</span>
          </>
        ) : refusal ? (
          <>
            <Icon name="stop" className="mt-1 text-stop" />
            <span className="text-stop">
              {refusalWords(refusal, session.asked.construction, units)} <MendButton parameter={refusal.parameter} refusal={refusal} />
            </span>
          </>
        ) : (
          <>
            <Icon name="tick" className="mt-1" />
            <span>{closesSentence(session.carton, (size) => showSize(size, units))}</span>
          </>
        )}
      </p>
      {typed === null && refusal && (
        <p className="pl-7 text-small text-ink-2">
          {more.length > 0 ? `${more.length} more ${more.length === 1 ? "figure does" : "figures do"} not fit either. ` : ""}The drawing shows the last figures that held.
        </p>
      )}
      {typed === null && !refusal && first && (
        <p className="flex items-start gap-2 pl-7 text-small">
          <Icon name={first.severity === "error" ? "stop" : "warning"} size={14} className="mt-0.5" />
          <span>
            <b>{findings.indexOf(first) + 1}</b> {findingSentence(first, format)} <MendFinding finding={first} />{" "}
            {findings.length > 1 && (
              <button type="button" onClick={onOpenCheck} className="border-b border-rule-2 hover:text-live">
                {findings.length - 1} more in the fold check
              </button>
            )}
          </span>
        </p>
      )}
    </div>
  );
}
