// The stage while the lever is off its stop. Fetched on first use: it brings the 3-D code with it.
import { useBench } from "./bench-context";
import { clampTo, type Lever, useLever } from "./lever";

export default function FoldStage({ lever }: { lever: Lever }) {
  const { session } = useBench();
  const u = clampTo(session.carton.fold, useLever(lever));
  return <p className="p-8">{u}</p>;
}
