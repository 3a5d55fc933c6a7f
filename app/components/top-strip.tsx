// The strip above every page but the Bench: where one is, where one can go, who one is.
import { type ReactNode, useEffect, useRef } from "react";
import { Form, Link as RouterLink, NavLink, useLocation } from "react-router";
import { may } from "~/auth/permissions";
import type { Viewer } from "~/auth/viewer";
import { ButtonLink, Switch } from "./button";
import { classNames } from "./class-names";
import { Icon } from "./icon";
import { usePreferences } from "./preferences";
import { Wordmark } from "./wordmark";

export interface Place {
  readonly to: string;
  readonly label: string;
}

/** The pages that this person's role reaches. */
export function placesFor(viewer: Viewer | null): readonly Place[] {
  if (viewer === null) return [{ to: "/constructions", label: "Constructions" }, { to: "/try", label: "Try the Bench" }];
  return [
    { to: "/", label: "Desk" },
    { to: "/cartons", label: "Cartons" },
    { to: "/constructions", label: "Constructions" },
    ...(may(viewer, "template.read") ? [{ to: "/templates", label: "Templates" }] : []),
    ...(may(viewer, "client.write") ? [{ to: "/clients", label: "Clients" }] : []),
  ];
}

export function TopStrip({ viewer }: { viewer: Viewer | null }) {
  return (
    <header className="no-print flex h-13 items-stretch gap-6 border-b border-ink bg-desk px-4 lg:px-5">
      <RouterLink to="/" className="flex items-center" aria-label="Cartonwright, to the Desk">
        <Wordmark height={18} />
      </RouterLink>
      <nav aria-label="Main" className="hidden items-stretch gap-5 pl-3 lg:flex">
        <Places viewer={viewer} />
      </nav>
      <div className="ml-auto hidden items-center gap-4 lg:flex">
        {viewer ? <PersonMenu viewer={viewer} /> : <SignInLinks />}
      </div>
      <FoldOut label="Menu" className="ml-auto self-center lg:hidden" summary={<Icon name="menu" size={20} title="Menu" />}>
        <nav aria-label="Main" className="flex flex-col">
          <Places viewer={viewer} isList />
        </nav>
        <div className="fold-rule my-2" />
        {viewer ? <PersonChoices viewer={viewer} /> : <SignInLinks />}
      </FoldOut>
    </header>
  );
}

function Places({ viewer, isList }: { viewer: Viewer | null; isList?: boolean }) {
  return placesFor(viewer).map(({ to, label }) => (
    <NavLink
      key={to}
      to={to}
      end={to === "/"}
      className={({ isActive }) =>
        isList
          ? classNames("flex min-h-11 items-center", isActive && "font-bold")
          : classNames("flex items-center border-b-2 border-t-2 border-t-transparent text-[14.5px]", isActive ? "border-b-ink font-bold" : "border-b-transparent text-ink-2 hover:text-live")
      }
    >
      {label}
    </NavLink>
  ));
}

function SignInLinks() {
  const { pathname, search } = useLocation();
  const next = pathname === "/" || pathname === "/sign-in" ? "" : `?next=${encodeURIComponent(pathname + search)}`;
  return (
    <>
      <ThemeSwitch />
      {pathname !== "/sign-in" && <ButtonLink to={`/sign-in${next}`} size="small">Sign in</ButtonLink>}
    </>
  );
}

export function PersonMenu({ viewer }: { viewer: Viewer }) {
  return (
    <FoldOut
      label={`${viewer.name}, ${viewer.role}`}
      summary={
        <span className="flex items-center gap-1.5 text-small">
          <b>{viewer.name}</b> <span className="text-ink-2">{viewer.role}</span> <Icon name="down" size={12} />
        </span>
      }
    >
      <PersonChoices viewer={viewer} />
    </FoldOut>
  );
}

export function PersonChoices({ viewer }: { viewer: Viewer }) {
  const line = "flex min-h-10 w-full items-center text-left hover:text-live max-md:min-h-11";
  return (
    <div className="flex flex-col">
      <p className="pb-1 text-label text-ink-2">
        {viewer.name}, {viewer.clientName ?? viewer.role}
      </p>
      <RouterLink to="/account" className={line}>Account</RouterLink>
      {may(viewer, "people.manage") && <RouterLink to="/people" className={line}>People</RouterLink>}
      {may(viewer, "trash.restore") && <RouterLink to="/trash" className={line}>Deleted things</RouterLink>}
      <div className="py-2"><ThemeSwitch /></div>
      <Form method="post" action="/sign-out">
        <button type="submit" className={line}>Sign out</button>
      </Form>
    </div>
  );
}

function ThemeSwitch() {
  const { theme, setTheme } = usePreferences();
  return (
    <Switch
      label="Theme"
      value={theme}
      onChange={setTheme}
      choices={[{ value: "system", label: "System" }, { value: "light", label: "Light" }, { value: "dark", label: "Dark" }]}
    />
  );
}

/** A sheet that unfolds under its button; works without script, closes on Esc, on a choice and on a press elsewhere. */
export function FoldOut({ label, summary, children, className, align = "right" }: { label: string; summary: ReactNode; children: ReactNode; className?: string; align?: "left" | "right" }) {
  const ref = useRef<HTMLDetailsElement>(null);
  const { key } = useLocation();
  useEffect(() => {
    if (ref.current) ref.current.open = false;
  }, [key]);
  useEffect(() => {
    const away = (event: PointerEvent | FocusEvent) => {
      const details = ref.current;
      if (details?.open && event.target instanceof Node && !details.contains(event.target)) details.open = false;
    };
    document.addEventListener("pointerdown", away);
    document.addEventListener("focusin", away);
    return () => {
      document.removeEventListener("pointerdown", away);
      document.removeEventListener("focusin", away);
    };
  }, []);
  return (
    <details
      ref={ref}
      className={classNames("relative", className)}
      onKeyDown={(event) => {
        if (event.key !== "Escape" || !ref.current?.open) return;
        event.stopPropagation();
        ref.current.open = false;
        ref.current.querySelector("summary")?.focus();
      }}
    >
      <summary aria-label={label} className="flex min-h-8 min-w-8 cursor-pointer list-none items-center justify-center max-md:min-h-11 max-md:min-w-11 [&::-webkit-details-marker]:hidden">
        {summary}
      </summary>
      <div className={classNames("absolute top-full z-30 min-w-56 border border-ink bg-paper px-4 py-3", align === "right" ? "right-0" : "left-0")}>{children}</div>
    </details>
  );
}
