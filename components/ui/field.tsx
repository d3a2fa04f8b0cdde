"use client";

import { createContext, use, useId, type ComponentProps, type ReactNode } from "react";
import { TriangleAlert } from "lucide-react";
import { cx } from "@/components/ui/cx";

type FieldLinks = { id: string; describedBy: string | undefined; invalid: boolean };

const FieldContext = createContext<FieldLinks | null>(null);

/** What a control inside a Field takes from it; outside one, nothing. */
const useFieldLinks = () => {
  const field = use(FieldContext);
  return field
    ? { id: field.id, "aria-describedby": field.describedBy, "aria-invalid": field.invalid || undefined }
    : {};
};

type Said = {
  /** The name of what is asked for. */
  label: ReactNode;
  /** A sentence that helps before anything is wrong. */
  hint?: ReactNode;
  /** A sentence that says what to type instead. */
  error?: ReactNode;
};

export function FieldError({ id, children }: { id?: string; children: ReactNode }) {
  return (
    <p id={id} className="flex items-start gap-2 font-semibold text-pin">
      <TriangleAlert aria-hidden="true" className="mt-[0.2em] size-[1.1em] shrink-0" />
      <span>{children}</span>
    </p>
  );
}

export type FieldProps = Said & {
  /** The control's id; made up when not given. */
  id?: string;
  /** Says "optional" beside the label. */
  optional?: boolean;
  className?: string;
  /** One TextInput, TextArea or Select. */
  children: ReactNode;
};

/** A label, one control, and below it the hint and the error, tied together for a screen reader. */
export function Field({ label, hint, error, id, optional, className, children }: FieldProps) {
  const made = useId();
  const control = id ?? made;
  const hintId = hint ? `${control}-hint` : undefined;
  const errorId = error ? `${control}-error` : undefined;
  const describedBy = cx(errorId, hintId) || undefined;
  return (
    <div className={cx("grid gap-1.5", className)}>
      <label htmlFor={control} className="font-semibold">
        {label}
        {optional && <span className="font-normal text-soft"> (optional)</span>}
      </label>
      <FieldContext value={{ id: control, describedBy, invalid: Boolean(error) }}>{children}</FieldContext>
      {error && <FieldError id={errorId}>{error}</FieldError>}
      {hint && (
        <p id={hintId} className="text-sm text-soft">
          {hint}
        </p>
      )}
    </div>
  );
}

const box =
  "w-full min-w-0 rounded border-2 border-edge bg-well px-3 py-2 text-ink placeholder:text-soft " +
  "aria-invalid:border-pin aria-invalid:border-dashed disabled:border-dashed disabled:text-soft";

export type TextInputProps = ComponentProps<"input"> & {
  /** A figure: large, tabular, with the number keys on a phone. */
  figure?: boolean;
  /** The unit, set after what is typed. */
  after?: ReactNode;
};

export function TextInput({ figure, after, className, ...rest }: TextInputProps) {
  const links = useFieldLinks();
  const input = (
    <input
      type="text"
      inputMode={figure ? "decimal" : undefined}
      autoComplete={figure ? "off" : undefined}
      {...links}
      {...rest}
      className={cx(
        box,
        "min-h-key",
        figure && "figures text-lg font-semibold",
        Boolean(after) && "pe-12",
        className,
      )}
    />
  );
  if (!after) return input;
  return (
    <span className="relative block">
      {input}
      <span className="pointer-events-none absolute inset-y-0 end-3 flex items-center text-soft">
        {after}
      </span>
    </span>
  );
}

export function TextArea({ className, rows = 3, ...rest }: ComponentProps<"textarea">) {
  const links = useFieldLinks();
  return <textarea rows={rows} {...links} {...rest} className={cx(box, "field-sizing-content", className)} />;
}

/** The phone's own list; options are its children. */
export function Select({ className, children, ...rest }: ComponentProps<"select">) {
  const links = useFieldLinks();
  return (
    <select {...links} {...rest} className={cx(box, "notched-select min-h-key pe-10", className)}>
      {children}
    </select>
  );
}

export type ChoiceOption<Value extends string = string> = {
  value: Value;
  label: ReactNode;
  /** A second line in the key. */
  sub?: ReactNode;
  disabled?: boolean;
};

export type ChoiceProps<Value extends string = string> = Said &
  Omit<ComponentProps<"input">, "type" | "value" | "defaultValue" | "id" | "children"> & {
    name: string;
    options: ReadonlyArray<ChoiceOption<Value>>;
    /** Which one is chosen, when the caller keeps it. Left out with `register`, which keeps it itself. */
    value?: Value;
    defaultValue?: Value;
    /** Keys one below the other, for long words. Default: side by side, as many as fit. */
    stacked?: boolean;
    /** The label only for a screen reader. */
    bare?: boolean;
  };

/** One of a few, as keys to press: native radio buttons, so arrow keys and `register` work. */
export function Choice<Value extends string = string>({
  label,
  hint,
  error,
  options,
  value,
  defaultValue,
  stacked,
  bare,
  className,
  ...rest
}: ChoiceProps<Value>) {
  const id = useId();
  const hintId = hint ? `${id}-hint` : undefined;
  const errorId = error ? `${id}-error` : undefined;
  return (
    <fieldset
      role="radiogroup"
      className={cx("grid min-w-0 gap-1.5", className)}
      aria-invalid={error ? true : undefined}
      aria-describedby={cx(errorId, hintId) || undefined}
    >
      <legend className={bare ? "sr-only" : "mb-1.5 font-semibold"}>{label}</legend>
      <div
        className={cx("choice-keys", !stacked && (options.length % 2 ? "choice-thirds" : "choice-halves"))}
      >
        {options.map((option) => (
          <label key={option.value} className={cx("choice-key", stacked && "justify-start text-start")}>
            <input
              {...rest}
              type="radio"
              value={option.value}
              disabled={rest.disabled || option.disabled}
              className="sr-only"
              {...(value !== undefined && { checked: value === option.value })}
              {...(defaultValue !== undefined && { defaultChecked: defaultValue === option.value })}
            />
            <span aria-hidden="true" className="choice-notch" />
            <span>
              <span className="block font-semibold">{option.label}</span>
              {option.sub && <span className="block text-sm">{option.sub}</span>}
            </span>
          </label>
        ))}
      </div>
      {error && <FieldError id={errorId}>{error}</FieldError>}
      {hint && (
        <p id={hintId} className="text-sm text-soft">
          {hint}
        </p>
      )}
    </fieldset>
  );
}

export type CheckProps = Said & Omit<ComponentProps<"input">, "type" | "children">;

/** Yes or no: a native checkbox with its words beside it; the whole row is the target. */
export function Check({ label, hint, error, className, id, ...rest }: CheckProps) {
  const made = useId();
  const control = id ?? made;
  const hintId = hint ? `${control}-hint` : undefined;
  const errorId = error ? `${control}-error` : undefined;
  return (
    <div className={cx("grid gap-1", className)}>
      <label htmlFor={control} className="flex min-h-target cursor-pointer items-center gap-3 py-1.5">
        <input
          {...rest}
          id={control}
          type="checkbox"
          aria-describedby={cx(errorId, hintId) || undefined}
          aria-invalid={error ? true : undefined}
          className="size-6 shrink-0 accent-ink"
        />
        <span>{label}</span>
      </label>
      {error && <FieldError id={errorId}>{error}</FieldError>}
      {hint && (
        <p id={hintId} className="ps-9 text-sm text-soft">
          {hint}
        </p>
      )}
    </div>
  );
}
