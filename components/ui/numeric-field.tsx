"use client";
import { useRef, useState, type KeyboardEvent, type ReactNode } from "react";
import type { Result } from "@/lib/result";
import { cx } from "@/components/ui/cx";
import { fieldClass } from "@/components/ui/field";
import { RefusedSign } from "@/components/ui/signs";

type NumericFieldProps = Readonly<{
  id?: string;
  /** The value that counts now; null is an empty field. */
  value: number | null;
  /** Text of a value at rest, in the unit of the field. */
  format: (value: number) => string;
  /** Text typed to a value; says what is wrong. */
  parse: (text: string) => Result<number>;
  /** Called on Enter and on leaving the field, with a value that parsed (or null where empty is allowed). */
  onCommit: (value: number | null) => void;
  /** Whether an empty field means "not asked"; else the last good value comes back. */
  optional?: boolean;
  unit?: ReactNode;
  placeholder?: string;
  set?: boolean;
  readOnly?: boolean;
  autoFocus?: boolean;
  className?: string;
  /** Width of the input. */
  inputClassName?: string;
  "aria-label"?: string;
  "aria-describedby"?: string | undefined;
}>;

const LOOKS_PLAIN = /^\s*[-−]?[\d\s.,]*\s*$/;

/**
 * A number typed as a person types it: sums ("632-36-32"), units ("3/8 in"), fractions. While a sum or a unit stands in the
 * field its result stands beside it; a refused text stays, with the reason, and the last good value still counts.
 */
export function NumericField(props: NumericFieldProps) {
  const {
    value,
    format,
    parse,
    onCommit,
    optional,
    unit,
    placeholder,
    set,
    readOnly,
    className,
    inputClassName,
    ...ids
  } = props;
  const [typed, setTyped] = useState<string | null>(null);
  const [asked, setAsked] = useState(false);
  const input = useRef<HTMLInputElement>(null);
  const empty = typed !== null && typed.trim() === "";
  const read = typed === null || empty ? null : parse(typed);
  const refused = asked && typed !== null && ((read !== null && !read.ok) || (empty && !optional));
  const atRest = value === null ? "" : format(value);

  const commit = () => {
    setAsked(true);
    if (typed === null) return;
    if (empty && optional) onCommit(null);
    else if (read?.ok) {
      if (read.value !== value) onCommit(read.value);
    } else return;
    setTyped(null);
  };
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key === "Enter") {
      event.preventDefault();
      commit();
      input.current?.select();
    }
    if (event.key === "Escape" && typed !== null) {
      event.stopPropagation();
      setTyped(null);
    }
  };

  const beside = read?.ok && !LOOKS_PLAIN.test(typed ?? "") ? format(read.value) : null;
  return (
    <span className={cx("inline-grid grid-cols-[auto_minmax(0,1fr)] items-center gap-x-1.5", className)}>
      <input
        {...ids}
        ref={input}
        type="text"
        autoComplete="off"
        spellCheck={false}
        readOnly={readOnly}
        placeholder={placeholder}
        value={typed ?? atRest}
        aria-invalid={refused || undefined}
        onChange={(event) => {
          setTyped(event.target.value);
          setAsked(false);
        }}
        onFocus={(event) => event.target.select()}
        onBlur={commit}
        onKeyDown={onKeyDown}
        className={cx(
          fieldClass({ refused, ...(set && { set }), ...(readOnly && { locked: readOnly }) }),
          "h-6 text-right font-num text-table font-[440] max-md:h-11",
          inputClassName ?? "w-[84px]",
        )}
      />
      <span className="text-note whitespace-nowrap text-ink-3">
        {beside !== null && (
          <>
            = <b className="font-num text-table text-ink-2">{beside}</b>{" "}
          </>
        )}
        {unit}
      </span>
      {refused && (
        <span role="alert" className="col-span-2 flex gap-1.5 text-note whitespace-normal text-oxide-ink">
          <RefusedSign className="mt-px" />
          <span>
            {empty ? "A number is needed here." : read && !read.ok ? read.error.detail : ""}
            {value !== null && ` The last good value, ${atRest}, still counts.`}
          </span>
        </span>
      )}
    </span>
  );
}
