import { useSyncExternalStore } from "react";

const never = () => () => undefined;

/** False on the server and in the first render of the browser, true from then on. */
export const useHydrated = (): boolean => useSyncExternalStore(never, () => true, () => false);
