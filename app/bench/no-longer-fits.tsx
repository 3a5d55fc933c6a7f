// A template whose construction has changed since it was saved: what was kept, the limit of today, the nearest that works.
import { Icon } from "~/components/icon";
import { usePreferences } from "~/components/preferences";
import { findConstruction } from "~/cartons/constructions/registry";
import type { Brief, OptionValue, Refusal } from "~/cartons/types";
import { parameterLabel } from "~/copy/refusals";
import { kindOf, showOption } from "./lengths";

export function NoLongerFits({ template, refusals }: { template: { readonly name: string; readonly note: string; readonly brief: Brief }; refusals: readonly Refusal[] }) {
  const { units } = usePreferences();
  const { brief, note } = template;
  const info = findConstruction(brief.construction)?.info;
  const words = (parameter: string, value: OptionValue) => (info ? showOption(value, parameter, kindOf(info, parameter), units, info) : String(value));
  const limitWords = ({ limit, parameter, code }: Refusal) => {
    if (code === "unknown-option") return "is no option any more";
    if (!limit) return "";
    if ("atLeast" in limit) return `at least ${words(parameter, limit.atLeast)}`;
    if ("atMost" in limit) return `at most ${words(parameter, limit.atMost)}`;
    return limit.oneOf.map((value) => words(parameter, value)).join(", ");
  };
  return (
    <section aria-label="The template" className="border-b border-rule py-4">
      {note && <p className="text-ink-2">{note}</p>}
      {refusals.length > 0 && (
        <>
          <h2 className="flex items-center gap-2 pt-2 text-figure font-black">
            <Icon name="warning" /> {refusals.length === 1 ? "One figure of this template no longer fits" : `${refusals.length} figures of this template no longer fit`}
          </h2>
          <p className="pt-1 text-small text-ink-2">The construction has changed since the template was saved. The pictures show the nearest figures that work; mend them below, or keep them by pressing what stands beside each.</p>
          <table className="mt-3 w-full border-collapse text-left">
            <caption className="sr-only">What no longer fits</caption>
            <thead>
              <tr className="border-b-2 border-ink text-label text-ink-2">
                {["Figure", "Was", "Today", "Nearest that works", "Because"].map((head) => <th key={head} scope="col" className="py-1 pr-4 font-bold last:max-md:hidden">{head}</th>)}
              </tr>
            </thead>
            <tbody>
              {refusals.map((refusal) => (
                <tr key={refusal.parameter} className="border-b border-rule align-baseline">
                  <th scope="row" className="py-1.5 pr-4 font-bold">{parameterLabel(refusal.parameter, brief.construction)}</th>
                  <td className="py-1.5 pr-4">{words(refusal.parameter, refusal.given)}</td>
                  <td className="py-1.5 pr-4">{limitWords(refusal)}</td>
                  <td className="py-1.5 pr-4">{refusal.nearest === null ? "the usual value" : words(refusal.parameter, refusal.nearest)}</td>
                  <td className="py-1.5 text-small text-ink-2 max-md:hidden">{refusal.because}</td>
                </tr>
              ))}
            </tbody>
          </table>
        </>
      )}
    </section>
  );
}
