// Short forms about a whole carton: its name and client, a template made from it.
import { type ReactNode, useEffect, useRef } from "react";
import { useFetcher } from "react-router";
import { Button } from "~/components/button";
import { Dialog } from "~/components/dialog";
import { ErrorSentence, RadioGroup, SelectField, TextArea, TextField } from "~/components/field";
import type { SaveAnswer, SavedCarton } from "~/forms/save-answer";
import { OFFLINE } from "./saving";
import type { Brief } from "~/cartons/types";

interface FormDialogProps {
  title: string;
  verb: string;
  isOpen: boolean;
  onClose: () => void;
  /** Called with what came back when it went well. */
  onDone: (answer: SaveAnswer) => void;
  hidden: Readonly<Record<string, string>>;
  children: (errors: Readonly<Record<string, readonly string[]>>) => ReactNode;
}

/** A form in a dialog: it closes when it went well, and keeps what was typed when it did not. */
function FormDialog({ title, verb, isOpen, onClose, onDone, hidden, children }: FormDialogProps) {
  const fetcher = useFetcher<SaveAnswer>();
  const { data, state } = fetcher;
  const seen = useRef<SaveAnswer | undefined>(undefined);
  useEffect(() => {
    if (state !== "idle" || !data || data === seen.current) return;
    seen.current = data;
    if (!("errors" in data || "problem" in data || "offline" in data || "refused" in data)) {
      onClose();
      onDone(data);
    } else if ("conflict" in data) onDone(data);
  }, [state, data, onClose, onDone]);
  const isMine = data !== undefined && isOpen;
  const errors = isMine && "errors" in data ? data.errors : {};
  const sentence = !isMine ? null : "problem" in data ? data.problem.sentence : "offline" in data ? OFFLINE : "refused" in data ? data.refused.join(" ") : null;
  return (
    <Dialog isOpen={isOpen} onClose={onClose} title={title}>
      <fetcher.Form method="post" className="flex flex-col gap-4">
        {Object.entries(hidden).map(([name, value]) => <input key={name} type="hidden" name={name} value={value} />)}
        {children(errors)}
        {sentence && <ErrorSentence>{sentence}</ErrorSentence>}
        <div className="flex items-center gap-3 pt-2">
          <Button look="main" type="submit" busy={state !== "idle"}>{verb}</Button>
          <Button look="plain" onClick={onClose}>Leave it</Button>
        </div>
      </fetcher.Form>
    </Dialog>
  );
}

type Client = { readonly id: string; readonly name: string };

export function DetailsDialog({ saved, clients, ...rest }: { saved: SavedCarton; clients: readonly Client[]; isOpen: boolean; onClose: () => void; onDone: (answer: SaveAnswer) => void }) {
  return (
    <FormDialog {...rest} title="Name, client and note" verb="Save them" hidden={{ intent: "details", rowVersion: String(saved.rowVersion) }}>
      {(errors) => (
        <>
          <TextField label="Name" name="name" defaultValue={saved.name} error={errors.name} />
          <SelectField label="Client" name="clientId" defaultValue={saved.clientId ?? ""} error={errors.clientId} choices={[{ value: "", label: "The studio itself" }, ...clients.map((c) => ({ value: c.id, label: c.name }))]} />
          <TextArea label="Note" name="note" defaultValue={saved.note} error={errors.note} hint="what somebody who opens it later should know" />
        </>
      )}
    </FormDialog>
  );
}

export function TemplateDialog({ saved, brief, ...rest }: { saved: SavedCarton; brief: Brief; isOpen: boolean; onClose: () => void; onDone: (answer: SaveAnswer) => void }) {
  return (
    <FormDialog {...rest} title="Keep it as a template" verb="Save the template" hidden={{ intent: "template", brief: JSON.stringify(brief) }}>
      {(errors) => (
        <>
          <p className="text-ink-2">A template holds what is asked: construction, size, board and options. Cartons for other clients start from it; this carton stays as it is.</p>
          <TextField label="Name" name="name" defaultValue={saved.name} error={errors.name} />
          <TextArea label="Note" name="note" error={errors.note} hint="what it is good for" />
          {saved.clientId ? (
            <RadioGroup legend="For" name="clientId" defaultValue="" stacked choices={[{ value: "", label: "every client of the studio" }, { value: saved.clientId, label: `${saved.clientName} only` }]} />
          ) : (
            <input type="hidden" name="clientId" value="" />
          )}
        </>
      )}
    </FormDialog>
  );
}
