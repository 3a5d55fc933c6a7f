// What is shown when a page cannot be: what happened, then what to do.
import { isRouteErrorResponse } from "react-router";
import { problemOf } from "~/copy/errors";
import { Button, ButtonLink } from "./button";
import { Page } from "./page";

interface Words {
  readonly title: string;
  readonly sentence: string;
  readonly status: number | null;
  readonly id: string | null;
}

function wordsFor(error: unknown): Words {
  if (isRouteErrorResponse(error)) {
    const problem = problemOf(error.data);
    if (problem) return problem;
    if (error.status === 404) return { title: "Nothing here", sentence: "There is nothing at this address. It may have been deleted, or the address may be mistyped.", status: 404, id: null };
    return { title: "This did not work", sentence: "The page did not come. Try it again.", status: error.status, id: null };
  }
  const isOffline = typeof navigator !== "undefined" && navigator.onLine === false;
  if (isOffline || (error instanceof TypeError && /fetch|network/i.test(error.message))) {
    return { title: "No connection", sentence: "The page did not come: there is no connection. Try it again when it is back.", status: null, id: null };
  }
  return { title: "This did not work", sentence: "Something is wrong on our side. Try it again; if it stays, go back to the Desk and tell the owner of the studio what you did.", status: 500, id: null };
}

export function ErrorPage({ error }: { error: unknown }) {
  const { title, sentence, status, id } = wordsFor(error);
  return (
    <Page>
      <div className="max-w-xl pt-8">
        <h1 className="text-h0 font-black">{title}</h1>
        <p className="pt-3 text-[17px] leading-7 text-ink-2">{sentence}</p>
        {id && <p className="pt-2 text-small text-ink-2">Number {id}</p>}
        <div className="flex flex-wrap items-center gap-4 pt-5">
          {status === 404 || status === 403 ? (
            <ButtonLink to="/" look="main">Go to the Desk</ButtonLink>
          ) : (
            <>
              <Button look="main" onClick={() => window.location.reload()}>Try again</Button>
              <ButtonLink to="/" look="plain">Go to the Desk</ButtonLink>
            </>
          )}
        </div>
      </div>
    </Page>
  );
}
