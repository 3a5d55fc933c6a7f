import { BOARDS } from "~/cartons/boards/catalogue";
import { listConstructions } from "~/cartons/constructions/registry";
import type { Brief } from "~/cartons/types";
import { Bench } from "~/bench/bench";
import { BenchStrip } from "~/bench/bench-strip";
import { useBench, type Side } from "~/bench/bench-context";
import { ExportMenu } from "~/bench/export-menu";
import { openFor } from "~/bench/use-session";
import { ButtonLink } from "~/components/button";
import { useState } from "react";
import type { Route } from "./+types/try";

export const meta: Route.MetaFunction = () => [{ title: "Try the Bench: Cartonwright" }];

/** A mailer for a puzzle: enough panels to show what the Bench does. */
const sample: Brief = { construction: "roll-end-mailer", size: { L: 240, W: 170, D: 60 }, basis: "inside", room: 1, board: "e-flute", options: {}, typed: {} };

export default function TryTheBench() {
  const [opened] = useState(() => openFor(sample, BOARDS));
  if (!opened) throw new Error("the sample is refused");
  return (
    <Bench
      opened={opened}
      boards={BOARDS}
      constructions={listConstructions()}
      name="A mailer to try"
      canEdit
      strip={({ side, openHelp }) => <TryStrip side={side} openHelp={openHelp} />}
    />
  );
}

function TryStrip({ side, openHelp }: { side: Side; openHelp: () => void }) {
  const { session } = useBench();
  const brief = JSON.stringify(session.carton.brief);
  const target = { addressOf: (format: string, options: Readonly<Record<string, string>>) => `/try/export/${format}?${new URLSearchParams({ ...options, brief })}` };
  return (
    <BenchStrip
      owner="To try"
      title={session.carton.construction.name}
      state="Nothing is saved here"
      openHelp={openHelp}
      more={null}
      actions={
        <>
          <ExportMenu target={target} side={side} />
          <ButtonLink to="/sign-in?next=/cartons/new" look="main" size="small" className="max-md:hidden">Sign in to save</ButtonLink>
        </>
      }
    />
  );
}
