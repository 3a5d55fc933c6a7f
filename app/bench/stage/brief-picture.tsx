import { FoldedPicture } from "../folded-picture";
import { useCarton } from "../use-cartons";
import { FlatPicture } from "./flat-picture";

/** A stored brief as a stamp for lists. Where it cannot be drawn its place stays empty: the words beside it say why. */
export function BriefPicture({ brief, width, height, folded }: { brief: unknown; width: number; height: number; folded?: boolean }) {
  const carton = useCarton(brief);
  if (!carton) return <span aria-hidden style={{ width, height }} className="inline-block" />;
  return folded ? <FoldedPicture carton={carton} width={width} height={height} /> : <FlatPicture carton={carton} width={width} height={height} />;
}
