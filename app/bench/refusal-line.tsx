import { ErrorSentence } from "~/components/field";
import type { Refusal } from "~/cartons/types";
import { useBench } from "./bench-context";
import { MendButton } from "./mend-button";
import { refusalWords } from "./refusal-words";

/** What cannot be, why, and the nearest value that works as one press. */
export function RefusalLine({ refusal, className }: { refusal: Refusal; className?: string }) {
  const { session, units } = useBench();
  return (
    <ErrorSentence className={className} mend={<MendButton parameter={refusal.parameter} refusal={refusal} />}>
      {refusalWords(refusal, session.asked.construction, units)}
    </ErrorSentence>
  );
}
