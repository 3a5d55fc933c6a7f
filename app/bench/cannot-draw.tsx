import { BOARDS } from "~/cartons/boards/catalogue";
import type { Brief } from "~/cartons/types";
import { ButtonLink } from "~/components/button";
import { Page } from "~/components/page";
import { TopStrip } from "~/components/top-strip";
import { useViewer } from "~/components/use-viewer";
import { refusalSentence } from "~/copy/refusals";
import { builderFor } from "./use-session";

/** A stored brief of which today's constructions make nothing at all. */
export function CannotDraw({ name, brief }: { name: string; brief: Brief }) {
  const result = builderFor(BOARDS)(brief);
  return (
    <>
      <TopStrip viewer={useViewer()} />
      <Page>
        <div className="max-w-xl pt-8">
          <h1 className="text-h0 font-black">{name} cannot be drawn</h1>
          {!result.ok && result.refusals.map((r) => <p key={r.parameter} className="pt-3 text-[17px] leading-7 text-ink-2">{refusalSentence(r, brief.construction)}</p>)}
          <p className="pt-3 text-[17px] leading-7 text-ink-2">What was asked is kept: {brief.size.L} × {brief.size.W} × {brief.size.D} mm. Start a new carton of this size.</p>
          <div className="flex flex-wrap gap-4 pt-5">
            <ButtonLink look="main" to={`/cartons/new?${new URLSearchParams({ L: String(brief.size.L), W: String(brief.size.W), D: String(brief.size.D), basis: brief.basis })}`}>Start a new carton</ButtonLink>
          </div>
        </div>
      </Page>
    </>
  );
}
