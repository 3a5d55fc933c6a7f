import { KnownError } from "~/copy/errors";

/** Every address that no other route takes: the same page as for things that are not there. */
export function loader(): never {
  throw new KnownError("not-found");
}

export default function NotFound() {
  return null;
}
