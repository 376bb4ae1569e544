"use client";
import { useState } from "react";
import { useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import { BayRow } from "@/components/office/bay-row";
import { officeKeys } from "@/components/office/office-keys";
import { OfficeNav, type OfficePage } from "@/components/office/office-nav";
import { ScrollAcross } from "@/components/office/scroll-across";
import { Sheet } from "@/components/sheet/sheet";
import { ActionCell, Cell, TitleBlock } from "@/components/sheet/title-block";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { EmptyBay } from "@/components/ui/empty-bay";
import { TextField } from "@/components/ui/field";
import { Notice } from "@/components/ui/notice";
import { Table, Th } from "@/components/ui/table";
import { api, ApiProblem, sentenceOf } from "@/lib/client/api";
import type { Bay, BayList, UpdateBayInput } from "@/lib/schemas/bay";

type BaysScreenProps = Readonly<{ pages: readonly OfficePage[]; firm: string; bays: BayList }>;

/** The bays of the Rack: order, names, which figures count, tolerance for deliveries. */
export function BaysScreen({ pages, firm, bays: initial }: BaysScreenProps) {
  const cache = useQueryClient();
  const [adding, setAdding] = useState(false);
  const [name, setName] = useState("");
  const { data } = useQuery({
    queryKey: officeKeys.bays(),
    queryFn: async ({ signal }) => (await api.get<BayList>("/bays", { signal })).data,
    initialData: initial,
  });
  const onSettled = () => cache.invalidateQueries({ queryKey: officeKeys.bays() });
  const change = useMutation({
    mutationFn: ({ bay, body }: { bay: Bay; body: UpdateBayInput }) =>
      api.patch<Bay>(`/bays/${bay.id}`, { body, ifMatch: `"${bay.version}"` }),
    onSettled,
  });
  const remove = useMutation({
    mutationFn: (bay: Bay) => api.delete(`/bays/${bay.id}`, { ifMatch: `"${bay.version}"` }),
    onSettled,
  });
  const add = useMutation({
    mutationFn: () => api.post<Bay>("/bays", { body: { name } }),
    onSuccess: () => {
      setAdding(false);
      setName("");
    },
    onSettled,
  });
  const failure = change.error ?? remove.error;
  const nameError = add.error
    ? (add.error instanceof ApiProblem && add.error.issueAt("/name")) || sentenceOf(add.error)
    : null;
  const addButton = (
    <Button kind="main" onClick={() => setAdding(true)}>
      Add a bay
    </Button>
  );

  return (
    <Sheet
      heading="Office: bays"
      block={
        <TitleBlock>
          <Cell label="Office" big>
            Bays
          </Cell>
          <Cell label="Firm" fill stays="md">
            {firm}
          </Cell>
          <Cell label="Bays">{data.items.length}</Cell>
          <ActionCell>{addButton}</ActionCell>
        </TitleBlock>
      }
    >
      <OfficeNav pages={pages} />
      {failure && (
        <Notice
          kind={failure instanceof ApiProblem && failure.stale ? "conflict" : "lost"}
          head="That change was not made."
          className="border-b border-rule p-3"
        >
          {sentenceOf(failure)}
        </Notice>
      )}
      {data.items.length === 0 ? (
        <EmptyBay
          head="There is no bay yet."
          actions={<Button onClick={() => setAdding(true)}>Add the first</Button>}
        >
          Shapes stand in bays; rights can differ from bay to bay.
        </EmptyBay>
      ) : (
        <ScrollAcross label="Bays">
          <Table>
            <caption className="sr-only">Bays in their order</caption>
            <thead>
              <tr>
                <Th className="pl-3.5!">Place</Th>
                <Th>Name</Th>
                <Th>Figures that count</Th>
                <Th numeric unit="%">
                  Tolerance
                </Th>
                <Th numeric>Released</Th>
                <Th>
                  <span className="sr-only">Actions</span>
                </Th>
              </tr>
            </thead>
            <tbody>
              {data.items.map((bay, index) => (
                <BayRow
                  key={`${bay.id} ${bay.version}`}
                  bay={bay}
                  last={index === data.items.length - 1}
                  atWork={change.isPending}
                  onChange={(body) => change.mutate({ bay, body })}
                  onDelete={() => remove.mutate(bay)}
                />
              ))}
            </tbody>
          </Table>
        </ScrollAcross>
      )}
      <Dialog
        open={adding}
        onOpenChange={setAdding}
        title="Add a bay"
        actions={
          <Button
            kind="main"
            disabled={name.trim() === ""}
            atWork={add.isPending}
            onClick={() => add.mutate()}
          >
            Add
          </Button>
        }
      >
        <TextField
          label="Name"
          value={name}
          maxLength={60}
          error={nameError}
          onChange={(event) => setName(event.target.value)}
          onKeyDown={(event) => event.key === "Enter" && name.trim() !== "" && add.mutate()}
          note="As it stands on the Rack, such as Purlins."
        />
      </Dialog>
    </Sheet>
  );
}
