// What is asked beside the figures: which size they are, and the board.
import { Icon } from "~/components/icon";
import type { UnitName } from "~/components/preferences";
import type { Brief, SizeBasis } from "~/cartons/types";
import { useBench } from "./bench-context";
import { Figure } from "./figure";
import { showLength, showSize } from "./lengths";
import { boardGroups } from "./board-choices";

export const basisWords: { readonly [Basis in SizeBasis]: string } = {
  inside: "inside",
  crease: "crease to crease",
  outside: "outside",
  product: "the product's, plus room",
};
/** "82 × 27 × 56 mm inside": a size never stands without saying which it is. */
export function askedSizeWords({ size, basis, room }: Pick<Brief, "size" | "basis" | "room">, units: UnitName): string {
  return basis === "product" ? `${showSize(size, units)} of product, ${showLength(room, units)} ${units} of room` : `${showSize(size, units)} ${basisWords[basis]}`;
}

const bases = Object.entries(basisWords) as [SizeBasis, string][];

/** A choice that reads as part of a sentence. */
function WordSelect({ label, value, onChange, children, words }: { label: string; value: string; onChange: (value: string) => void; children: React.ReactNode; words: string }) {
  const { canEdit } = useBench();
  if (!canEdit) return <span className="text-small text-ink-2">{words}</span>;
  return (
    <span className="relative inline-flex max-w-full items-center text-small">
      <select
        aria-label={label}
        value={value}
        onChange={(event) => onChange(event.target.value)}
        className="min-h-7 max-w-60 cursor-pointer appearance-none truncate [field-sizing:content] border-b border-rule-2 bg-transparent pr-5 text-ink-2 hover:border-ink hover:text-live max-md:min-h-11 max-md:border-b-0"
      >
        {children}
      </select>
      <Icon name="down" size={12} className="pointer-events-none absolute right-0 text-ink-2" />
    </span>
  );
}

export function BasisSelect() {
  const { session, setBasis } = useBench();
  return (
    <WordSelect label="These sizes are" value={session.asked.basis} onChange={(value) => setBasis(value as SizeBasis)} words={basisWords[session.asked.basis]}>
      {bases.map(([basis, words]) => <option key={basis} value={basis}>{words}</option>)}
    </WordSelect>
  );
}

export function BoardSelect() {
  const { session, set, boards } = useBench();
  const { board, construction } = session.carton;
  const groups = boardGroups(boards, construction.families, session.asked.board);
  return (
    <WordSelect label="Board" value={session.asked.board} onChange={(value) => set("board", value)} words={board.name}>
      {groups.map((group) => (
        <optgroup key={group.label} label={group.label}>
          {group.boards.map((b) => <option key={b.id} value={b.id}>{b.name}</option>)}
        </optgroup>
      ))}
    </WordSelect>
  );
}

export function RoomFigure() {
  return <Figure parameter="room" label="Room on each side" kind="length" look="row" />;
}
