"use client";
import { useBench, useBenchActions } from "@/components/bench/bench-store";
import { QuantityField } from "@/components/display/quantity-field";
import { UnitOf } from "@/components/display/quantity";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { fieldClass } from "@/components/ui/field";
import { Table, Td, Th } from "@/components/ui/table";
import { addMaterial, changeMaterial, leastFy, removeMaterial, setReference } from "@/lib/drawing/materials";
import { SOFTWOOD, STEEL } from "@/lib/drawing/new-drawing";
import type { DrawingMaterial } from "@/lib/drawing/schema";

const positive = (name: string) => (value: number) => (value > 0 ? null : `${name} must be above 0.`);

/** The materials of the drawing: all values are the user's to type. */
export const MaterialsDialog = ({ onClose }: { onClose: () => void }) => {
  const drawing = useBench((s) => s.history.now);
  const act = useBenchActions();
  const change = (m: DrawingMaterial, next: Partial<DrawingMaterial>) =>
    act.edit((d) => changeMaterial(d, m.id, next));
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title="Materials of this drawing"
      text="Type the values your code and your certificate give. Where E differs, figures are transformed to the reference material."
      width="sheet"
      actions={
        <>
          <Button onClick={() => act.edit((d) => addMaterial(d, STEEL))}>Add a steel</Button>
          <Button onClick={() => act.edit((d) => addMaterial(d, SOFTWOOD))}>Add a timber</Button>
        </>
      }
    >
      <div className="overflow-x-auto">
        <Table>
          <thead>
            <tr>
              <Th>Name</Th>
              <Th numeric unit={<UnitOf dimension="stress" />}>
                E
              </Th>
              <Th numeric unit={<UnitOf dimension="stress" />}>
                G
              </Th>
              <Th numeric unit={<UnitOf dimension="stress" />}>
                Yield strength
              </Th>
              <Th numeric unit={<UnitOf dimension="density" />}>
                Density
              </Th>
              <Th>Reference</Th>
              <Th>
                <span className="sr-only">Remove</span>
              </Th>
            </tr>
          </thead>
          <tbody>
            {drawing.materials.map((m) => {
              const used = drawing.parts.some((p) => p.cutout !== true && p.material === m.id);
              const field = (key: "E" | "G" | "density", name: string) => (
                <Td className="px-1 text-right">
                  <QuantityField
                    bare
                    aria-label={`${name} of ${m.name}`}
                    dimension={key === "density" ? "density" : "stress"}
                    value={m[key]}
                    refuse={positive(name)}
                    onCommit={(v) => v !== null && change(m, { [key]: v })}
                  />
                </Td>
              );
              return (
                <tr key={m.id}>
                  <Td className="px-1">
                    <input
                      aria-label={`Name of ${m.name}`}
                      defaultValue={m.name}
                      maxLength={120}
                      onBlur={(e) =>
                        e.target.value.trim() &&
                        e.target.value !== m.name &&
                        change(m, { name: e.target.value.trim() })
                      }
                      className={`${fieldClass()} h-6 w-36 text-table max-md:h-11`}
                    />
                  </Td>
                  {field("E", "E")}
                  {field("G", "G")}
                  <Td className="px-1 text-right">
                    <QuantityField
                      bare
                      aria-label={`Yield strength of ${m.name}`}
                      dimension="stress"
                      value={leastFy(m)}
                      refuse={positive("The yield strength")}
                      onCommit={(fy) => fy !== null && change(m, { fy })}
                    />
                    {typeof m.fy !== "number" && (
                      <span className="block text-note text-ink-3">
                        by thickness: {m.fy.map((band) => `${band.fy} to ${band.upTo} mm`).join(", ")}
                      </span>
                    )}
                  </Td>
                  {field("density", "Density")}
                  <Td>
                    <input
                      type="radio"
                      name="reference"
                      aria-label={`${m.name} is the reference`}
                      checked={m.id === drawing.reference}
                      onChange={() => act.edit((d) => setReference(d, m.id))}
                      className="size-6 accent-(--fb-ink)"
                    />
                  </Td>
                  <Td>
                    <Button
                      size="small"
                      disabled={used || m.id === drawing.reference}
                      title={
                        used ? "Parts use it" : m.id === drawing.reference ? "It is the reference" : undefined
                      }
                      aria-label={`Remove ${m.name}`}
                      onClick={() => act.edit((d) => removeMaterial(d, m.id))}
                    >
                      remove
                    </Button>
                  </Td>
                </tr>
              );
            })}
          </tbody>
        </Table>
      </div>
    </Dialog>
  );
};
