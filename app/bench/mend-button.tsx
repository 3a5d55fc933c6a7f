import { Button } from "~/components/button";
import type { Finding, Refusal } from "~/cartons/types";
import { useBench } from "./bench-context";
import { kindOf, showOption } from "./lengths";

/** "Make it 62": sets the nearest value that works, one step of the history. */
export function MendButton({ parameter, refusal, onDone }: { parameter: string; refusal: Pick<Refusal, "nearest">; onDone?: () => void }) {
  const { session, units, set, canEdit } = useBench();
  const { nearest } = refusal;
  if (nearest === null || !canEdit) return null;
  return (
    <Button
      look="mend"
      onClick={() => {
        set(parameter, nearest);
        onDone?.();
      }}
    >
      Make it {showOption(nearest, parameter, kindOf(session.carton.construction, parameter), units, session.carton.construction)}
    </Button>
  );
}

/** The same for what a check found. */
export function MendFinding({ finding }: { finding: Finding }) {
  if (!finding.mend) return null;
  return <MendButton parameter={finding.mend.parameter} refusal={{ nearest: finding.mend.value }} />;
}
