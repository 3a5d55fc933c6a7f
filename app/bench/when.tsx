import { useHydrated } from "~/components/use-hydrated";
import { timeWords } from "./use-saving";

const plain = new Intl.DateTimeFormat("en-GB", { day: "numeric", month: "short", year: "numeric", timeZone: "UTC" });

/** A moment in the reader's own time; the server, which does not know it, writes the day. */
export function When({ at }: { at: string | Date }) {
  const isHydrated = useHydrated();
  const date = new Date(at);
  return (
    <time dateTime={date.toISOString()} className="whitespace-nowrap">
      {isHydrated ? timeWords(date.toISOString(), new Date()) : plain.format(date)}
    </time>
  );
}
