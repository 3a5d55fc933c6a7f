import { createContext, RouterContextProvider } from "react-router";

/** What the HTTP server knows of a request and the router does not. */
export interface RequestFacts {
  /** Network address of the caller, from the socket (or from the proxy where one is trusted). */
  readonly address: string;
  /** Names this request in the log and in the X-Request-Id header. */
  readonly requestId: string;
}

export const requestFactsContext = createContext<RequestFacts>({ address: "unknown", requestId: "none" });

/** Made by the HTTP server for every request; reached through `entry.server.tsx`. */
export function createLoadContext(facts: RequestFacts): RouterContextProvider {
  const context = new RouterContextProvider();
  context.set(requestFactsContext, facts);
  return context;
}
