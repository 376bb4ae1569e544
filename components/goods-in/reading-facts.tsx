"use client";
import { useState } from "react";
import { NumericTolerance } from "@/components/goods-in/tolerance-field";
import { Button } from "@/components/ui/button";
import { Checkbox } from "@/components/ui/choice";
import { TextField } from "@/components/ui/field";
import { SelectField } from "@/components/ui/select";
import { PaneSubhead } from "@/components/ui/table";
import { sentenceOf } from "@/lib/client/api";
import { useKeepReading, useReadings } from "@/lib/client/deliveries";
import { CONVENTION_CODES, CONVENTIONS } from "@/lib/intake/conventions";
import { ENCODING_NAME, ENCODINGS } from "@/lib/intake/decode-bytes";
import { DELIMITER_NAME, DELIMITERS } from "@/lib/intake/delimiters";
import { FAMILIES, STOCK_MATERIALS, type Reading } from "@/lib/intake/schema";
import type { Recognised } from "@/lib/schemas/delivery";

type ReadingFactsProps = Readonly<{
  recognised: Recognised;
  reading: Reading;
  disabled: boolean;
  onRead: (reading: Reading) => void;
}>;

const MARKS = [
  { value: ",", label: "decimal comma", marks: { decimal: ",", thousands: null } },
  { value: ",.", label: "comma, thousands point", marks: { decimal: ",", thousands: "." } },
  { value: ", ", label: "comma, thousands space", marks: { decimal: ",", thousands: " " } },
  { value: ",'", label: "comma, thousands apostrophe", marks: { decimal: ",", thousands: "'" } },
  { value: ".", label: "decimal point", marks: { decimal: ".", thousands: null } },
  { value: ".,", label: "point, thousands comma", marks: { decimal: ".", thousands: "," } },
  { value: ". ", label: "point, thousands space", marks: { decimal: ".", thousands: " " } },
  { value: ".'", label: "point, thousands apostrophe", marks: { decimal: ".", thousands: "'" } },
] as const;

/** Headings are looked for in the first 20 lines. */
const LINES = Array.from({ length: 20 }, (_, i) => i + 1);

const markOf = ({ marks }: Reading): string =>
  marks === null ? "" : `${marks.decimal}${marks.thousands ?? ""}`;

/** How the file is read beyond its columns: each point with its evidence, each correctable; conventions; the name to keep it by. */
export function ReadingFacts({ recognised, reading, disabled, onRead }: ReadingFactsProps) {
  const { evidence } = recognised;
  return (
    <>
      <PaneSubhead className="border-t">Read as</PaneSubhead>
      <div className="grid grid-cols-2 gap-3 p-3">
        <SelectField
          label="Encoding"
          value={reading.encoding}
          disabled={disabled}
          choices={ENCODINGS.map((value) => ({ value, label: ENCODING_NAME[value] }))}
          onChange={(encoding) => onRead({ ...reading, encoding })}
          note={evidence.encoding}
        />
        <SelectField
          label="Delimiter"
          value={reading.delimiter}
          disabled={disabled}
          choices={DELIMITERS.map((value) => ({ value, label: DELIMITER_NAME[value] }))}
          onChange={(delimiter) => onRead({ ...reading, delimiter })}
          note={evidence.delimiter}
        />
        <SelectField
          label="Marks"
          value={markOf(reading)}
          disabled={disabled}
          choices={[
            ...(reading.marks === null ? [{ value: "", label: "not known: choose", disabled: true }] : []),
            ...MARKS.map(({ value, label }) => ({ value: value as string, label })),
          ]}
          onChange={(value) =>
            onRead({ ...reading, marks: MARKS.find((m) => m.value === value)?.marks ?? null })
          }
          note={evidence.marks}
        />
        <SelectField
          label="Headings in line"
          value={String(reading.headingLine)}
          disabled={disabled}
          choices={LINES.map((line) => ({ value: String(line), label: String(line) }))}
          onChange={(value) => onRead({ ...reading, headingLine: Number(value), unitLine: null })}
          note={evidence.headings}
        />
        <SelectField
          label="Units"
          value={reading.unitLine === null ? "" : String(reading.unitLine)}
          disabled={disabled}
          choices={[
            { value: "", label: "in the headings" },
            {
              value: String(reading.unitLine ?? reading.headingLine + 1),
              label: `in line ${reading.unitLine ?? reading.headingLine + 1}`,
            },
          ]}
          onChange={(value) => onRead({ ...reading, unitLine: value === "" ? null : Number(value) })}
        />
        <SelectField
          label="Family, where the series does not say"
          value={reading.family ?? ""}
          disabled={disabled}
          choices={[
            { value: "", label: "by series or designation" },
            ...FAMILIES.map((value) => ({ value: value as string, label: value })),
          ]}
          onChange={(value) => onRead({ ...reading, family: FAMILIES.find((f) => f === value) ?? null })}
        />
        <SelectField
          label="Material"
          value={reading.material}
          disabled={disabled}
          choices={STOCK_MATERIALS.map((value) => ({ value, label: value }))}
          onChange={(material) => onRead({ ...reading, material })}
        />
        <NumericTolerance
          value={reading.tolerance}
          disabled={disabled}
          onChange={(tolerance) => onRead({ ...reading, tolerance })}
        />
      </div>
      {evidence.axes !== null && (
        <p className="px-3 pb-3 text-note text-ink-2">
          <b>Axes.</b> {evidence.axes}.
        </p>
      )}
      <PaneSubhead className="border-t">Conventions of this table</PaneSubhead>
      <div className="grid gap-2 p-3">
        {CONVENTION_CODES.map((code) => (
          <div key={code}>
            <Checkbox
              label={CONVENTIONS[code].label}
              checked={reading.conventions.includes(code)}
              disabled={disabled}
              onChange={(on) =>
                onRead({
                  ...reading,
                  conventions: on
                    ? [...reading.conventions, code]
                    : reading.conventions.filter((c) => c !== code),
                })
              }
            />
            <p className="pl-7 text-note text-ink-3">{CONVENTIONS[code].detail}</p>
          </div>
        ))}
      </div>
      <KeepReading reading={reading} usedName={evidence.reading} />
    </>
  );
}

function KeepReading({ reading, usedName }: Readonly<{ reading: Reading; usedName: string | null }>) {
  const [name, setName] = useState(usedName ?? "");
  const kept = useReadings(true);
  const keep = useKeepReading();
  const same = kept.data?.find((r) => r.name.toLowerCase() === name.trim().toLowerCase());
  return (
    <>
      <PaneSubhead className="border-t">Keep this reading</PaneSubhead>
      <form
        className="grid gap-2 p-3"
        onSubmit={(event) => {
          event.preventDefault();
          if (name.trim() !== "") keep.mutate({ name: name.trim(), reading, same });
        }}
      >
        <TextField
          label="Name, for the next delivery with these headings"
          value={name}
          maxLength={120}
          onChange={(event) => setName(event.target.value)}
          error={keep.isError ? sentenceOf(keep.error) : null}
          note={usedName === null ? undefined : `This file was read by “${usedName}”.`}
        />
        <div className="flex items-center gap-3">
          <Button type="submit" disabled={name.trim() === "" || keep.isPending}>
            {same === undefined ? "Keep" : `Change “${same.name}”`}
          </Button>
          <span role="status" className="text-note text-ink-3">
            {keep.isSuccess && "Kept."}
          </span>
        </div>
      </form>
    </>
  );
}
