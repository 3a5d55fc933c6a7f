// A label, a control and the sentence beside it. Every field of every form is one of these.
import { type InputHTMLAttributes, type ReactNode, type Ref, type SelectHTMLAttributes, type TextareaHTMLAttributes, useId } from "react";
import { classNames } from "./class-names";
import { Icon } from "./icon";

export interface FieldFrame {
  label: string;
  /** A hint in small type under the control. */
  hint?: ReactNode;
  /** What is wrong and what to type, one sentence or several. */
  error?: ReactNode | readonly string[];
  /** A link on the label's line, e.g. "Forgotten it". */
  aside?: ReactNode;
  /** A one-click mend after the error. */
  mend?: ReactNode;
  hideLabel?: boolean;
  className?: string;
}

export interface ControlIds {
  id: string;
  "aria-describedby": string | undefined;
  "aria-invalid": true | undefined;
}

export const controlClasses = "w-full min-h-10 rounded-control border bg-board px-3 text-figure max-md:min-h-11";
export const edgeClasses = (isWrong: boolean) => (isWrong ? "border-2 border-stop" : "border-rule-2 hover:border-ink");

/** The frame alone, for controls of other kinds; gives the control what names and describes it. */
export function Field({ label, hint, error, aside, mend, hideLabel, className, children }: FieldFrame & { children: (ids: ControlIds) => ReactNode }) {
  const id = useId();
  const sentences = Array.isArray(error) ? (error as readonly string[]).join(" ") : (error as ReactNode);
  const isWrong = Boolean(sentences);
  const describedBy = [isWrong && `${id}-error`, hint && `${id}-hint`].filter(Boolean).join(" ") || undefined;
  return (
    <div className={className}>
      <div className={classNames("flex items-baseline justify-between gap-3 pb-1", hideLabel && "sr-only")}>
        <label htmlFor={id} className="text-small font-bold">
          {label}
        </label>
        {aside && <span className="text-small">{aside}</span>}
      </div>
      {children({ id, "aria-describedby": describedBy, "aria-invalid": isWrong || undefined })}
      {isWrong && <ErrorSentence id={`${id}-error`} mend={mend}>{sentences}</ErrorSentence>}
      {hint && (
        <p id={`${id}-hint`} className="pt-1 text-label text-ink-3">
          {hint}
        </p>
      )}
    </div>
  );
}

/** ✕ box and sentence: never colour alone. Announced when it appears. */
export function ErrorSentence({ id, children, mend, className }: { id?: string; children: ReactNode; mend?: ReactNode; className?: string }) {
  return (
    <p id={id} role="alert" className={classNames("flex items-start gap-2 pt-1.5 text-small text-stop", className)}>
      <Icon name="stop" size={14} className="mt-0.5" />
      <span>
        {children} {mend}
      </span>
    </p>
  );
}

type TextFieldProps = FieldFrame & Omit<InputHTMLAttributes<HTMLInputElement>, "className" | "id"> & { ref?: Ref<HTMLInputElement> };

export function TextField({ label, hint, error, aside, mend, hideLabel, className, ref, ...input }: TextFieldProps) {
  return (
    <Field {...{ label, hint, error, aside, mend, hideLabel, className }}>
      {(ids) => <input type="text" ref={ref} {...input} {...ids} className={classNames(controlClasses, edgeClasses(Boolean(ids["aria-invalid"])))} />}
    </Field>
  );
}

type TextAreaProps = FieldFrame & Omit<TextareaHTMLAttributes<HTMLTextAreaElement>, "className" | "id">;

export function TextArea({ label, hint, error, aside, mend, hideLabel, className, ...input }: TextAreaProps) {
  return (
    <Field {...{ label, hint, error, aside, mend, hideLabel, className }}>
      {(ids) => <textarea rows={3} {...input} {...ids} className={classNames(controlClasses, "py-2 text-base", edgeClasses(Boolean(ids["aria-invalid"])))} />}
    </Field>
  );
}

export interface Choice {
  readonly value: string;
  readonly label: string;
  /** Heading under which it stands in the list. */
  readonly group?: string;
}

type SelectFieldProps = FieldFrame & Omit<SelectHTMLAttributes<HTMLSelectElement>, "className" | "id" | "children"> & { choices: readonly Choice[]; controlClassName?: string };

export function SelectField({ label, hint, error, aside, mend, hideLabel, className, controlClassName, choices, ...select }: SelectFieldProps) {
  const groups = [...new Set(choices.map((choice) => choice.group))];
  const optionsOf = (group: string | undefined) =>
    choices.filter((choice) => choice.group === group).map((choice) => (
      <option key={choice.value} value={choice.value}>
        {choice.label}
      </option>
    ));
  return (
    <Field {...{ label, hint, error, aside, mend, hideLabel, className }}>
      {(ids) => (
        <span className="relative block">
          <select {...select} {...ids} className={classNames(controlClasses, "appearance-none pr-9", controlClassName, edgeClasses(Boolean(ids["aria-invalid"])))}>
            {groups.map((group) =>
              group === undefined ? optionsOf(group) : <optgroup key={group} label={group}>{optionsOf(group)}</optgroup>,
            )}
          </select>
          <Icon name="down" className="pointer-events-none absolute right-3 top-1/2 -translate-y-1/2 text-ink-2" />
        </span>
      )}
    </Field>
  );
}

export interface RadioGroupProps {
  legend: string;
  name: string;
  choices: readonly { readonly value: string; readonly label: string; readonly hint?: string }[];
  value?: string;
  defaultValue?: string;
  onChange?: (value: string) => void;
  error?: ReactNode;
  hideLegend?: boolean;
  className?: string;
  /** Stacked, one a line. */
  stacked?: boolean;
}

export function RadioGroup({ legend, name, choices, value, defaultValue, onChange, error, hideLegend, className, stacked }: RadioGroupProps) {
  const id = useId();
  return (
    <fieldset className={className} aria-describedby={error ? `${id}-error` : undefined}>
      <legend className={classNames("pb-1 text-small font-bold", hideLegend && "sr-only")}>{legend}</legend>
      <div className={classNames("flex", stacked ? "flex-col gap-1" : "flex-wrap gap-x-5 gap-y-1")}>
        {choices.map((choice) => (
          <label key={choice.value} className="inline-flex min-h-6 cursor-pointer items-start gap-2 max-md:min-h-11 max-md:items-center">
            <input
              type="radio"
              name={name}
              value={choice.value}
              checked={value === undefined ? undefined : value === choice.value}
              defaultChecked={value === undefined ? defaultValue === choice.value : undefined}
              onChange={onChange ? () => onChange(choice.value) : undefined}
              className="peer mt-0.5 size-4 shrink-0 appearance-none rounded-full border-[1.5px] border-rule-2 bg-board checked:border-[5px] checked:border-ink max-md:mt-0"
            />
            <span className="peer-checked:font-bold">
              {choice.label}
              {choice.hint && <span className="block text-label font-normal text-ink-3">{choice.hint}</span>}
            </span>
          </label>
        ))}
      </div>
      {error && <ErrorSentence id={`${id}-error`}>{error}</ErrorSentence>}
    </fieldset>
  );
}

export function CheckBox({ label, hint, className, ...input }: { label: ReactNode; hint?: ReactNode; className?: string } & Omit<InputHTMLAttributes<HTMLInputElement>, "className" | "type">) {
  return (
    <label className={classNames("inline-flex min-h-6 cursor-pointer items-start gap-2 max-md:min-h-11 max-md:items-center", className)}>
      <span className="relative mt-0.5 inline-flex size-4 shrink-0 max-md:mt-0">
        <input type="checkbox" {...input} className="peer size-4 appearance-none rounded-control border-[1.5px] border-rule-2 bg-board checked:border-ink checked:bg-ink" />
        <Icon name="tick" size={12} className="pointer-events-none absolute left-0.5 top-0.5 hidden text-paper peer-checked:block" />
      </span>
      <span>
        {label}
        {hint && <span className="block text-label text-ink-3">{hint}</span>}
      </span>
    </label>
  );
}
