import { Dialog } from "~/components/dialog";

const keys: readonly { readonly title: string; readonly rows: readonly (readonly [string, string])[] }[] = [
  {
    title: "Figures",
    rows: [
      ["Enter", "open the figure that has the focus; keep what was typed"],
      ["Esc", "put back what it was"],
      ["Arrows", "one step up or down; Shift ten, Alt a tenth"],
      ["Drag left or right", "the same with the pointer"],
      ["Ctrl Z", "undo; Ctrl Shift Z or Ctrl Y redoes"],
      ["Ctrl S", "save"],
    ],
  },
  {
    title: "Fold lever",
    rows: [
      ["F", "fold it, or unfold it"],
      ["[ and ]", "one degree back or on, from anywhere"],
      ["Arrows", "one degree, with the focus on the lever"],
      ["Page Up, Page Down", "one station on or back"],
      ["Home, End", "flat, closed, with the focus on the lever"],
    ],
  },
  {
    title: "Drawing",
    rows: [
      ["+ and −", "larger, smaller; so does the wheel"],
      ["0", "fit the stage"],
      ["1", "true size"],
      ["Arrows", "move it, with the focus on the drawing"],
      ["T", "turn it over: inside up, print side up"],
    ],
  },
  {
    title: "Beside the stage",
    rows: [["L", "Ledger"], ["O", "options"], ["C", "fold check"], ["?", "this list"]],
  },
];

export function HelpDialog({ isOpen, onClose }: { isOpen: boolean; onClose: () => void }) {
  return (
    <Dialog isOpen={isOpen} onClose={onClose} title="Keys of the Bench" wide>
      <div className="grid gap-x-8 gap-y-5 md:grid-cols-2">
        {keys.map(({ title, rows }) => (
          <section key={title}>
            <h3 className="border-b-2 border-ink pb-1 text-small font-bold">{title}</h3>
            <dl>
              {rows.map(([key, does]) => (
                <div key={key} className="flex gap-4 border-b border-rule py-1.5">
                  <dt className="w-32 shrink-0 font-bold">{key}</dt>
                  <dd className="text-ink-2">{does}</dd>
                </div>
              ))}
            </dl>
          </section>
        ))}
      </div>
      <p className="pt-4 text-small text-ink-2">
        A figure takes sums and units: 80+2*1, 4 3/4in, 12,5. True size on the screen holds where the screen shows 96 px an inch; print the tiled sheets at 100 % and measure their bar to be sure.
      </p>
    </Dialog>
  );
}
