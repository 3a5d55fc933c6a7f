import { Icon, type IconName } from "./icon";

const states = {
  draft: { glyph: "draft", word: "Draft" },
  out: { glyph: "out", word: "Out" },
  approved: { glyph: "approved", word: "Approved" },
  released: { glyph: "released", word: "Released" },
  asked: { glyph: "warning", word: "Changes asked" },
  warning: { glyph: "warning", word: "To look at" },
  closes: { glyph: "tick", word: "Folds shut" },
} as const satisfies Record<string, { glyph: IconName; word: string }>;

export type State = keyof typeof states;

/** A small ink glyph with a word: shape and word before colour. */
export function StateBadge({ state, children }: { state: State; children?: string }) {
  const { glyph, word } = states[state];
  return (
    <span className="inline-flex items-center gap-1.5 text-small">
      <Icon name={glyph} size={14} />
      {children ?? word}
    </span>
  );
}
