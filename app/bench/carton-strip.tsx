// The strip above a carton that is kept: its name, how saving stands, its files.
import { useCallback, useState } from "react";
import { useFetcher, useNavigate, useSubmit } from "react-router";
import { Button } from "~/components/button";
import { Icon } from "~/components/icon";
import { useToast } from "~/components/toast";
import { useHydrated } from "~/components/use-hydrated";
import { BenchStrip } from "./bench-strip";
import { type Side, useBench } from "./bench-context";
import { DetailsDialog, TemplateDialog } from "./carton-dialogs";
import { ConflictDialog } from "./conflict-dialog";
import { ExportMenu } from "./export-menu";
import type { SaveAnswer, SavedCarton } from "~/forms/save-answer";
import type { SaveState } from "./saving";
import { timeWords, useSaving } from "./use-saving";

export interface CartonStripProps {
  cartonId: string;
  loaded: SavedCarton;
  clients: readonly { readonly id: string; readonly name: string }[];
  side: Side;
  openHelp: () => void;
}

type OpenDialog = "details" | "template" | "conflict" | null;

export function CartonStrip({ cartonId, loaded, clients, side, openHelp }: CartonStripProps) {
  const { session, canEdit } = useBench();
  const saving = useSaving(cartonId, loaded);
  const { state, saved } = saving;
  const [dialog, setDialog] = useState<OpenDialog>(null);
  const [dismissed, setDismissed] = useState<SavedCarton | null>(null);
  const copier = useFetcher<SaveAnswer>();
  const submit = useSubmit();
  const navigate = useNavigate();
  const toast = useToast();
  const close = useCallback(() => setDialog(null), []);
  const theirs = state.kind === "conflict" ? state.theirs : null;
  const isConflictOpen = theirs !== null && (dialog === "conflict" || theirs !== dismissed);

  const onDone = useCallback((answer: SaveAnswer) => {
    if ("saved" in answer) saving.accept(answer.saved);
    if ("template" in answer) toast({ sentence: `“${answer.template.name}” is kept as a template.`, undo: () => void navigate(`/templates/${answer.template.id}`), undoLabel: "Open it" });
  }, [saving, toast, navigate]);
  const putAway = async () => {
    await submit({ intent: "delete" }, { method: "post", action: `/cartons/${cartonId}`, navigate: false, fetcherKey: `delete-${cartonId}` });
    await navigate("/cartons");
    toast({
      sentence: `“${saved.name}” is deleted. It can be brought back for 30 days.`,
      undo: () => void submit({ intent: "restore", id: cartonId }, { method: "post", action: "/cartons", navigate: false, fetcherKey: `restore-${cartonId}` }),
    });
  };
  const target = {
    addressOf: (format: string, options: Readonly<Record<string, string>>) =>
      state.kind === "saved"
        ? `/cartons/${cartonId}/export/${format}?${new URLSearchParams(options)}`
        : `/cartons/${cartonId}/export/${format}?${new URLSearchParams({ ...options, brief: JSON.stringify(session.carton.brief) })}`,
  };
  const line = "flex min-h-10 w-full items-center text-left hover:text-live max-md:min-h-11";
  return (
    <>
      <BenchStrip
        owner={saved.clientName ?? "The studio"}
        title={canEdit ? <button type="button" onClick={() => setDialog("details")} title="Change name, client and note" className="max-w-full truncate font-bold hover:text-live">{saved.name}</button> : saved.name}
        state={canEdit ? <SaveWords state={state} saved={saved} onRetry={saving.save} onChoose={() => setDialog("conflict")} /> : `Saved by ${saved.updatedBy}`}
        openHelp={openHelp}
        more={
          canEdit && (
            <>
              <button type="button" className={line} onClick={() => setDialog("details")}>Name, client and note</button>
              <button type="button" className={line} onClick={() => setDialog("template")} disabled={session.refusals.length > 0}>Keep it as a template</button>
              <button type="button" className={line} onClick={() => void putAway()}>Delete this carton</button>
            </>
          )
        }
        actions={
          <>
            <ExportMenu target={target} side={side} />
            {canEdit && (
              <Button
                look="main"
                size="small"
                busy={state.kind === "saving"}
                disabled={state.kind === "saved" || state.kind === "refused"}
                title={state.kind === "refused" ? "Mend the figures first" : "Ctrl S"}
                onClick={() => (state.kind === "conflict" ? setDialog("conflict") : saving.save())}
              >
                {state.kind === "failed" ? "Try again" : "Save"}
              </Button>
            )}
          </>
        }
      />
      {saving.left && canEdit && (
        <div role="status" className="flex flex-wrap items-center gap-x-4 gap-y-1 border-b border-ink bg-wash px-4 py-2 text-small lg:px-8">
          <span>What you did here at {timeWords(saving.left.at, new Date())} was not saved.</span>
          <Button look="mend" onClick={() => saving.left && saving.takeUp(saving.left)}>Take it up again</Button>
          <Button look="plain" onClick={saving.putAway}>Throw it away</Button>
        </div>
      )}
      {state.kind === "failed" && (
        <div role="alert" className="flex flex-wrap items-center gap-x-4 gap-y-1 border-b border-ink px-4 py-2 text-small text-stop lg:px-8">
          <Icon name="stop" size={14} />
          <span>{state.sentence}</span>
          <Button look="mend" onClick={saving.save}>Try again</Button>
        </div>
      )}
      {canEdit && <DetailsDialog saved={saved} clients={clients} isOpen={dialog === "details"} onClose={close} onDone={onDone} />}
      {canEdit && <TemplateDialog saved={saved} brief={session.carton.brief} isOpen={dialog === "template"} onClose={close} onDone={onDone} />}
      {theirs && (
        <ConflictDialog
          isOpen={isConflictOpen}
          theirs={theirs}
          onClose={() => {
            setDismissed(theirs);
            close();
          }}
          onTakeTheirs={() => saving.takeTheirs(theirs)}
          onSaveOver={() => saving.saveOver(theirs)}
          onCopy={() => void copier.submit({ intent: "copy", brief: JSON.stringify(session.asked), name: `${saved.name}, copy` }, { method: "post" })}
        />
      )}
    </>
  );
}

/** "Saved 10:42", or what keeps it from being saved. */
function SaveWords({ state, saved, onRetry, onChoose }: { state: SaveState; saved: SavedCarton; onRetry: () => void; onChoose: () => void }) {
  // The clock on the wall differs between server and browser.
  const isHydrated = useHydrated();
  switch (state.kind) {
    case "saved":
      return <span role="status">Saved {isHydrated ? timeWords(saved.updatedAt, new Date()) : ""}</span>;
    case "saving":
      return <span role="status">Saving …</span>;
    case "unsaved":
      return <span role="status">Not saved yet</span>;
    case "refused":
      return <span role="status">Not saved: a figure does not fit</span>;
    case "conflict":
      return <Button look="mend" onClick={onChoose}>Not saved: {state.theirs.updatedBy} was first</Button>;
    case "failed":
      return <Button look="mend" onClick={onRetry}>Not saved. Try again</Button>;
  }
}
