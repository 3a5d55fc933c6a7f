import type { ReactNode } from "react";
import { Links, Meta, Outlet, Scripts, ScrollRestoration, type ShouldRevalidateFunctionArgs, useRouteLoaderData } from "react-router";
import type { Route } from "./+types/root";
import { sessionContext } from "./auth/session-context";
import { sessionMiddleware } from "./auth/session-middleware.server";
import { ErrorPage } from "./components/error-page";
import { PreferencesProvider, readPreferences } from "./components/preferences";
import { ToastProvider } from "./components/toast";
import { TopStrip } from "./components/top-strip";
import "./app.css";

export const meta: Route.MetaFunction = () => [{ title: "Cartonwright" }];

export const links: Route.LinksFunction = () => [
  { rel: "icon", href: "/favicon.ico", sizes: "32x32" },
  { rel: "icon", href: "/favicon.svg", type: "image/svg+xml" },
];

export const middleware: Route.MiddlewareFunction[] = [sessionMiddleware];

export function loader({ request, context }: Route.LoaderArgs) {
  return { preferences: readPreferences(request.headers.get("Cookie")), viewer: context.get(sessionContext)?.viewer ?? null };
}

/** After a form that could not be sent or kept there is nothing new to ask for; asking would put an error page over what was typed. */
export function shouldRevalidate({ actionResult, defaultShouldRevalidate }: ShouldRevalidateFunctionArgs): boolean {
  const isLost = typeof actionResult === "object" && actionResult !== null && ("offline" in actionResult || "problem" in actionResult);
  return !isLost && defaultShouldRevalidate;
}

export function Layout({ children }: { children: ReactNode }) {
  const root = useRouteLoaderData<typeof loader>("root");
  const preferences = root?.preferences ?? { theme: "system", units: "mm" };
  return (
    <html lang="en" data-theme={preferences.theme === "system" ? undefined : preferences.theme} suppressHydrationWarning>
      <head>
        <meta charSet="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <Meta />
        <Links />
      </head>
      <body>
        <a href="#content" className="skip-link">Skip to the content</a>
        <PreferencesProvider initial={preferences}>
          <ToastProvider>{children}</ToastProvider>
        </PreferencesProvider>
        <ScrollRestoration />
        <Scripts />
      </body>
    </html>
  );
}

/** Pages bring their own strip: the Bench has one that is different. */
export default function App() {
  return <Outlet />;
}

export function ErrorBoundary({ error }: Route.ErrorBoundaryProps) {
  const root = useRouteLoaderData<typeof loader>("root");
  return (
    <>
      <TopStrip viewer={root?.viewer ?? null} />
      <ErrorPage error={error} />
    </>
  );
}
