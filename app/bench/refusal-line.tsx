import { ErrorSentence } from "~/components/field";
import { refusalSentence } from "~/copy/refusals";
import type { Refusal } from "~/cartons/types";
import { useBench } from "./bench-context";
import { withUnit } from "./lengths";
import { MendButton } from "./mend-button";

/** What cannot be, why, and the nearest value that works as one press. */
export function RefusalLine({ refusal, className }: { refusal: Refusal; className?: string }) {
  const { session, units } = useBench();
  return (
    <ErrorSentence className={className} mend={<MendButton parameter={refusal.parameter} refusal={refusal} />}>
      {refusalSentence(refusal, session.asked.construction, (mm) => withUnit(mm, "length", units))}
    </ErrorSentence>
  );
}
