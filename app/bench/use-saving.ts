// Saves what is on the Bench, keeps what could not be saved, and tries again when the connection is back.
import { useCallback, useEffect, useRef, useState } from "react";
import { useFetcher } from "react-router";
import { useBench } from "./bench-context";
import { type Draft, dropDraft, readDraft, writeDraft } from "./draft";
import type { SaveAnswer, SavedCarton } from "~/forms/save-answer";
import { type SaveState, saveStateOf } from "./saving";
import { isSameBrief } from "./session";

export interface Saving {
  readonly state: SaveState;
  readonly saved: SavedCarton;
  /** What was left unsaved in this browser the last time; null when there is nothing, or it was dealt with. */
  readonly left: Draft | null;
  save(): void;
  /** Over what the other person saved, after seeing it. */
  saveOver(theirs: SavedCarton): void;
  takeTheirs(theirs: SavedCarton): void;
  takeUp(draft: Draft): void;
  putAway(): void;
  /** A save under another form on this page came through. */
  accept(saved: SavedCarton): void;
}

const when = new Intl.DateTimeFormat("en-GB", { hour: "2-digit", minute: "2-digit" });
const day = new Intl.DateTimeFormat("en-GB", { day: "numeric", month: "short" });

/** "10:42" today, "3 Dec 10:42" before that. */
export function timeWords(iso: string, now: Date): string {
  const at = new Date(iso);
  return at.toDateString() === now.toDateString() ? when.format(at) : `${day.format(at)} ${when.format(at)}`;
}

export function useSaving(cartonId: string, loaded: SavedCarton): Saving {
  const { session, replace } = useBench();
  const { asked } = session;
  const fetcher = useFetcher<SaveAnswer>();
  const [saved, setSaved] = useState(loaded);
  const [answer, setAnswer] = useState<SaveAnswer | null>(null);
  const [left, setLeft] = useState<Draft | null>(null);
  const isBusy = fetcher.state !== "idle";
  const state = saveStateOf({ asked, isRefused: session.refusals.length > 0, saved, isBusy, answer });

  useEffect(() => {
    const draft = readDraft(cartonId);
    if (draft && !isSameBrief(draft.brief, loaded.brief)) setLeft(draft);
    else dropDraft(cartonId);
    // Once, for what this page was opened with.
  }, [cartonId]);

  // Every answer is looked at once, when it comes.
  const seen = useRef<SaveAnswer | undefined>(undefined);
  useEffect(() => {
    const { data } = fetcher;
    if (fetcher.state !== "idle" || !data || data === seen.current) return;
    seen.current = data;
    setAnswer(data);
    if ("saved" in data) setSaved(data.saved);
  }, [fetcher, fetcher.state, fetcher.data]);

  useEffect(() => {
    if (isSameBrief(asked, saved.brief)) {
      // What was left from last time stays until it is taken up or put away.
      if (!left) dropDraft(cartonId);
    } else {
      writeDraft(cartonId, { brief: asked, rowVersion: saved.rowVersion, at: new Date().toISOString() });
      setLeft(null);
    }
  }, [asked, saved, cartonId, left]);

  const latest = useRef({ asked, saved, state });
  latest.current = { asked, saved, state };
  const { submit } = fetcher;
  const send = useCallback((rowVersion: number) => {
    setAnswer(null);
    const { asked } = latest.current;
    void submit({ intent: "save", brief: JSON.stringify(asked), rowVersion: String(rowVersion) }, { method: "post" });
  }, [submit]);
  const save = useCallback(() => {
    const { kind } = latest.current.state;
    if (kind === "unsaved" || kind === "failed") send(latest.current.saved.rowVersion);
  }, [send]);

  useEffect(() => {
    const back = () => {
      const { state } = latest.current;
      if (state.kind === "failed" && state.isOffline) save();
    };
    const onKeyDown = (event: KeyboardEvent) => {
      if ((event.ctrlKey || event.metaKey) && event.key.toLowerCase() === "s") {
        event.preventDefault();
        save();
      }
    };
    window.addEventListener("online", back);
    window.addEventListener("keydown", onKeyDown);
    return () => {
      window.removeEventListener("online", back);
      window.removeEventListener("keydown", onKeyDown);
    };
  }, [save]);

  return {
    state, saved, left, save,
    saveOver: (theirs) => send(theirs.rowVersion),
    takeTheirs: (theirs) => {
      setAnswer(null);
      setSaved(theirs);
      replace(theirs.brief);
    },
    takeUp: (draft) => {
      setLeft(null);
      replace(draft.brief);
    },
    putAway: () => {
      setLeft(null);
      dropDraft(cartonId);
    },
    accept: (next) => {
      setAnswer(null);
      setSaved(next);
    },
  };
}
