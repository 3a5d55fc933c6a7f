// Two people saved the same carton: both are kept until one is chosen.
import { Button } from "~/components/button";
import { Dialog } from "~/components/dialog";
import type { OptionValue } from "~/cartons/types";
import { parameterLabel } from "~/copy/refusals";
import { basisWords } from "./asked-selects";
import { useBench } from "./bench-context";
import { kindOf, showOption } from "./lengths";
import type { SavedCarton } from "~/forms/save-answer";
import { differences } from "./saving";
import { timeWords } from "./use-saving";

export function ConflictDialog({ isOpen, theirs, onClose, onTakeTheirs, onSaveOver, onCopy }: { isOpen: boolean; theirs: SavedCarton; onClose: () => void; onTakeTheirs: () => void; onSaveOver: () => void; onCopy: () => void }) {
  const { session, units, boards } = useBench();
  const { construction } = session.carton;
  const unlike = differences(session.asked, theirs.brief);
  const words = (parameter: string, value: unknown): string => {
    if (value === undefined) return "the usual value";
    if (parameter === "basis") return basisWords[value as keyof typeof basisWords];
    if (parameter === "board") return boards.find((b) => b.id === value)?.name ?? String(value);
    return showOption(value as OptionValue, parameter, kindOf(construction, parameter), units, construction);
  };
  const label = (parameter: string) => (parameter === "basis" ? "These sizes are" : parameter === "room" ? "Room on each side" : parameterLabel(parameter, construction.id));
  return (
    <Dialog
      isOpen={isOpen}
      onClose={onClose}
      title={`${theirs.updatedBy} saved this carton at ${timeWords(theirs.updatedAt, new Date())}. What becomes of yours?`}
      wide
      actions={
        <>
          <Button look="main" onClick={onCopy}>Save mine as a copy</Button>
          <Button onClick={onTakeTheirs}>Take theirs</Button>
          <Button onClick={onSaveOver}>Save mine over it</Button>
        </>
      }
    >
      <p className="pb-3 text-ink-2">Nothing is lost yet: theirs is saved, yours is on the Bench and kept in this browser. Taking theirs can be undone.</p>
      {unlike.length === 0 ? (
        <p>Both ask the same; only how it was typed is different.</p>
      ) : (
        <table className="w-full border-collapse text-left">
          <caption className="sr-only">What is different</caption>
          <thead>
            <tr className="border-b-2 border-ink text-label text-ink-2">
              <th scope="col" className="py-1 pr-4 font-bold">Figure</th>
              <th scope="col" className="py-1 pr-4 text-right font-bold">Theirs</th>
              <th scope="col" className="py-1 text-right font-bold">Yours</th>
            </tr>
          </thead>
          <tbody>
            {unlike.map((d) => (
              <tr key={d.parameter} className="border-b border-rule">
                <th scope="row" className="py-1.5 pr-4 font-normal">{label(d.parameter)}</th>
                <td className="py-1.5 pr-4 text-right">{words(d.parameter, d.theirs)}</td>
                <td className="py-1.5 text-right font-bold">{words(d.parameter, d.mine)}</td>
              </tr>
            ))}
          </tbody>
        </table>
      )}
    </Dialog>
  );
}
