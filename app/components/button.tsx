import type { ButtonHTMLAttributes, ReactNode, Ref } from "react";
import { Link as RouterLink, type LinkProps } from "react-router";
import { classNames } from "./class-names";

/** `main`: one a view. `outline`: the others. `plain`: inside strips and tables, as a link looks. `mend`: a one-click mend. */
export type ButtonLook = "main" | "outline" | "plain" | "mend";
export type ButtonSize = "normal" | "small";

const looks: Record<ButtonLook, string> = {
  main: "border border-ink bg-ink text-paper font-bold hover:bg-ink-2 hover:border-ink-2 aria-disabled:bg-ink-3 aria-disabled:border-ink-3",
  outline: "border border-ink bg-transparent text-ink font-bold hover:bg-desk aria-disabled:border-rule-2 aria-disabled:text-ink-3",
  plain: "underline decoration-rule-2 decoration-1 underline-offset-4 text-ink hover:decoration-ink hover:text-live aria-disabled:text-ink-3",
  mend: "underline decoration-live-line decoration-1 underline-offset-4 text-live font-bold hover:bg-wash",
};
const boxes: Record<ButtonSize, string> = {
  normal: "min-h-10 px-4 py-2 text-base max-md:min-h-11",
  small: "min-h-8 px-3 py-1 text-small max-md:min-h-11",
};

function classes(look: ButtonLook, size: ButtonSize, className?: string): string {
  const isBox = look === "main" || look === "outline";
  return classNames(
    "inline-flex items-center justify-center gap-2",
    isBox ? classNames("rounded-control text-center", boxes[size]) : // In the middle of a sentence: the target grows under a thumb, the line does not.
        "relative min-h-6 text-left leading-[22px] max-md:after:absolute max-md:after:inset-x-0 max-md:after:-inset-y-2.5 max-md:after:content-['']",
    looks[look],
    className,
  );
}

export interface ButtonProps extends ButtonHTMLAttributes<HTMLButtonElement> {
  look?: ButtonLook;
  size?: ButtonSize;
  /** Work is under way: the words stay, the button takes no second press. */
  busy?: boolean;
  ref?: Ref<HTMLButtonElement>;
}

/** Words are verb + object. A button that cannot be used yet stays in the tab order and says why through `title`. */
export function Button({ look = "outline", size = "normal", type = "button", busy, disabled, className, onClick, children, ...rest }: ButtonProps) {
  const isOff = Boolean(disabled || busy);
  return (
    <button
      {...rest}
      type={isOff && type === "submit" ? "button" : type}
      aria-disabled={isOff || undefined}
      aria-busy={busy || undefined}
      className={classes(look, size, className)}
      onClick={isOff ? (event) => event.preventDefault() : onClick}
    >
      {children}
    </button>
  );
}

export interface ButtonLinkProps extends LinkProps {
  look?: ButtonLook;
  size?: ButtonSize;
}

/** A link that looks like a button: for what opens another page. */
export function ButtonLink({ look = "outline", size = "normal", className, ...rest }: ButtonLinkProps) {
  return <RouterLink {...rest} className={classes(look, size, className)} />;
}

/** A link to a file that the browser takes down: no client-side navigation. */
export function FileLink({ href, children, look = "plain", className, ...rest }: { href: string; children: ReactNode; look?: ButtonLook; className?: string; download?: string | boolean; "aria-label"?: string }) {
  return (
    <a {...rest} href={href} className={classes(look, "small", className)}>
      {children}
    </a>
  );
}

/** The name of a row in a list: bold, and large enough for a thumb without taking more room. */
export function RowLink({ className, ...rest }: LinkProps) {
  return <RouterLink {...rest} className={classNames("relative font-bold hover:text-live after:absolute after:inset-x-0 after:-inset-y-1 after:content-[''] max-md:after:-inset-y-3", className)} />;
}

export function Link({ className, ...rest }: LinkProps) {
  return <RouterLink {...rest} className={classNames("underline decoration-rule-2 decoration-1 underline-offset-4 hover:decoration-ink hover:text-live", className)} />;
}

/** A few words of which one is chosen at once: "mm | in". */
export function Switch<Value extends string>({ label, value, choices, onChange, className }: {
  label: string;
  value: Value;
  choices: readonly { readonly value: Value; readonly label: string; readonly hint?: string }[];
  onChange: (value: Value) => void;
  className?: string;
}) {
  return (
    <div role="group" aria-label={label} className={classNames("inline-flex rounded-control border border-rule-2", className)}>
      {choices.map((choice) => (
        <button
          key={choice.value}
          type="button"
          aria-pressed={choice.value === value}
          title={choice.hint}
          onClick={() => onChange(choice.value)}
          className={classNames(
            "min-h-7 px-3 text-small max-md:min-h-11 max-md:px-4",
            choice.value === value ? "bg-ink font-bold text-paper" : "text-ink-2 hover:bg-wash hover:text-live",
          )}
        >
          {choice.label}
        </button>
      ))}
    </div>
  );
}
