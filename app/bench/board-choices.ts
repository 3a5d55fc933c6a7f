import type { Board } from "~/cartons/boards/board";
import type { ConstructionInfo } from "~/cartons/types";

export interface BoardGroup {
  readonly label: string;
  readonly boards: readonly Board[];
}

const labels = { carton: "Cartonboard", micro: "Micro-flute" } as const;

/** Boards that the construction is offered in, by family, thin before thick; the one that is asked is always among them. */
export function boardGroups(boards: readonly Board[], families: ConstructionInfo["families"], asked?: string): readonly BoardGroup[] {
  return (["carton", "micro"] as const)
    .map((family) => ({
      label: labels[family],
      boards: boards.filter((b) => b.family === family && (families.includes(family) || b.id === asked)).sort((a, b) => a.caliper - b.caliper),
    }))
    .filter((group) => group.boards.length > 0);
}
