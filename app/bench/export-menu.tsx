// The files of what is on the Bench now, seen from the side that is up.
import { useId, useState } from "react";
import { FoldOut } from "~/components/top-strip";
import { Icon } from "~/components/icon";
import { RadioGroup } from "~/components/field";
import { type Side, useBench } from "./bench-context";

export interface ExportTarget {
  /** Address of a format for a side; the brief on the Bench goes along where it is not saved. */
  addressOf(format: string, options: Readonly<Record<string, string>>): string;
}

const files: readonly { readonly format: string; readonly options: Readonly<Record<string, string>>; readonly title: string; readonly hint: string }[] = [
  { format: "pdf", options: {}, title: "PDF", hint: "layers, separations, dimensions, title block" },
  { format: "svg", options: {}, title: "SVG", hint: "millimetres, one group a layer" },
  { format: "dxf", options: {}, title: "DXF", hint: "millimetres, one layer a process" },
  { format: "pdf", options: { tiles: "a4" }, title: "Sheets of A4, true size", hint: "print at 100 %, measure the bar" },
  { format: "pdf", options: { tiles: "letter" }, title: "Sheets of Letter, true size", hint: "print at 100 %, measure the bar" },
];

export function ExportMenu({ target, side }: { target: ExportTarget; side: Side }) {
  const { session } = useBench();
  const [chosen, setChosen] = useState<Side | null>(null);
  const id = useId();
  const seen = chosen ?? side;
  const isRefused = session.refusals.length > 0;
  return (
    <FoldOut label="Export" summary={<span className="flex items-center gap-1.5 rounded-control border border-ink px-3 py-1 text-small font-bold hover:bg-paper max-md:min-h-11">Export <Icon name="down" size={12} /></span>}>
      <div className="w-72 max-w-[80vw]">
        <RadioGroup
          legend="Seen from"
          name={`${id}-side`}
          value={seen}
          onChange={(value) => setChosen(value as Side)}
          choices={[{ value: "inside", label: "the inside" }, { value: "print", label: "the print side" }]}
        />
        {isRefused && <p className="pt-2 text-small text-ink-2">The files show the last figures that held.</p>}
        <ul className="pt-2">
          {files.map(({ format, options, title, hint }) => (
            <li key={title} className="border-t border-rule">
              <a href={target.addressOf(format, { ...options, side: seen })} download className="block py-2 hover:text-live">
                <span className="font-bold">{title}</span>
                <span className="block text-label text-ink-2">{hint}</span>
              </a>
            </li>
          ))}
        </ul>
      </div>
    </FoldOut>
  );
}
