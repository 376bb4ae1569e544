import type { DeliverySummary } from "@/lib/schemas/delivery";

/** The state of a delivery in words, with what waits for a person. */
export function stateWords(delivery: Pick<DeliverySummary, "state" | "counts">): string {
  switch (delivery.state) {
    case "announced":
      return "waits for its file";
    case "received":
      return "waits to be read";
    case "reading":
      return "is being read";
    case "read":
      return delivery.counts !== null && delivery.counts.undecided > 0
        ? `${delivery.counts.undecided} to decide`
        : "ready to put away";
    case "putting-away":
      return "is being put away";
    case "put-away":
      return "put away";
    case "returned":
      return "returned";
    case "stopped":
      return "stopped";
    case "failed":
      return "given back";
    default:
      return delivery.state satisfies never;
  }
}
