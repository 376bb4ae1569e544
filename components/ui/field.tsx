"use client";
import { useId, type ComponentProps, type ReactNode } from "react";
import { cx } from "@/components/ui/cx";
import { RefusedSign } from "@/components/ui/signs";

/** Typed values stand on a rule; a locked one is dotted; a refused one has the heavy oxide rule. */
export const fieldClass = (state: { refused?: boolean; locked?: boolean; set?: boolean } = {}): string =>
  cx(
    "min-w-0 border-0 border-b bg-field px-1.5 text-ink rounded-none outline-offset-1",
    state.refused || state.set ? "border-b-2 border-oxide-ink" : "border-edge",
    state.set && "font-[640]",
    state.locked && "border-dotted bg-transparent text-ink-2",
  );

type FieldProps = Readonly<{
  label: ReactNode;
  /** A sentence under the field, always visible. */
  note?: ReactNode;
  /** What is wrong and what still counts. */
  error?: string | null | undefined;
  className?: string;
  children: (ids: {
    id: string;
    "aria-describedby": string | undefined;
    "aria-invalid": true | undefined;
  }) => ReactNode;
}>;

/** Label above at 11 px, always visible; the error beneath, with its sign, spoken when it appears. */
export function Field({ label, note, error, className, children }: FieldProps) {
  const id = useId();
  const describedBy = cx(!!note && `${id}-note`, !!error && `${id}-error`) || undefined;
  return (
    <div className={cx("min-w-0", className)}>
      <label htmlFor={id} className="mb-1 block text-micro text-ink-2">
        {label}
      </label>
      {children({ id, "aria-describedby": describedBy, "aria-invalid": error ? true : undefined })}
      {note && (
        <p id={`${id}-note`} className="mt-1 text-note text-ink-3">
          {note}
        </p>
      )}
      <p
        id={`${id}-error`}
        aria-live="polite"
        className={error ? "mt-1 flex gap-1.5 text-note text-oxide-ink" : "sr-only"}
      >
        {error && (
          <>
            <RefusedSign className="mt-px" />
            <span>{error}</span>
          </>
        )}
      </p>
    </div>
  );
}

type TextFieldProps = Omit<ComponentProps<"input">, "id"> & Pick<FieldProps, "label" | "note" | "error">;

export function TextField({ label, note, error, className, readOnly, ...rest }: TextFieldProps) {
  return (
    <Field label={label} note={note} error={error} {...(className && { className })}>
      {(ids) => (
        <input
          {...ids}
          {...rest}
          readOnly={readOnly}
          className={cx(fieldClass({ refused: !!error, locked: !!readOnly }), "h-7 w-full max-md:h-11")}
        />
      )}
    </Field>
  );
}

type TextAreaProps = Omit<ComponentProps<"textarea">, "id"> & Pick<FieldProps, "label" | "note" | "error">;

export function TextArea({ label, note, error, className, ...rest }: TextAreaProps) {
  return (
    <Field label={label} note={note} error={error} {...(className && { className })}>
      {(ids) => (
        <textarea
          {...ids}
          rows={3}
          {...rest}
          className={cx(fieldClass({ refused: !!error }), "block w-full resize-y py-1")}
        />
      )}
    </Field>
  );
}
