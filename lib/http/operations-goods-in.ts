import "server-only";
import { PageQuery } from "@/lib/schemas/common";
import * as delivery from "@/lib/schemas/delivery";
import * as reading from "@/lib/schemas/reading";
import { GONE, del, get, patch, post, put, type Operation } from "./operation";

export const GOODS_IN_OPERATIONS: readonly Operation[] = [
  get("/deliveries", "delivery.list", "Deliveries, newest first", {
    query: PageQuery,
    answer: delivery.DeliveryPage,
  }),
  post("/deliveries", "delivery.create", "Announce a delivery", {
    body: delivery.CreateDeliveryInput,
    answer: delivery.Delivery,
    status: 201,
  }),
  get("/deliveries/{id}", "delivery.show", "A delivery", { answer: delivery.Delivery }),
  del("/deliveries/{id}", "delivery.delete", "Delete a delivery that was not put away", GONE),
  put("/deliveries/{id}/file", "delivery.putFile", "The raw file, streamed", {
    media: "application/octet-stream",
    answer: delivery.Delivery,
    version: true,
  }),
  get("/deliveries/{id}/rows", "delivery.rows", "Its rows with verdicts", {
    query: delivery.FindRowsQuery,
    answer: delivery.RowPage,
  }),
  get("/deliveries/{id}/rows/{n}", "delivery.rows", "One row in full", { answer: delivery.RowDetail }),
  patch("/deliveries/{id}/rows/{n}", "delivery.decide", "Decide about a row, or mend a cell", {
    body: delivery.DecideRowInput,
    answer: delivery.DecidedRows,
    version: true,
  }),
  get("/deliveries/{id}/queries.csv", "delivery.rows", "Queried and refused rows with reasons", {
    media: "text/csv",
  }),
  put("/deliveries/{id}/reading", "delivery.putReading", "Correct how the file is read", {
    body: delivery.PutReadingInput,
    answer: delivery.Delivery,
    version: true,
  }),
  post("/deliveries/{id}/put-away", "delivery.putAway", "Put the delivery away on the Rack", {
    body: delivery.PutAwayInput,
    answer: delivery.Delivery,
    version: true,
  }),
  post("/deliveries/{id}/return", "delivery.return", "Return the delivery whole", {
    body: delivery.ReturnDeliveryInput,
    answer: delivery.Delivery,
    version: true,
  }),
  post("/deliveries/{id}/stop", "delivery.stop", "Stop what is being done with it", {
    answer: delivery.Delivery,
  }),
  get("/readings", "reading.list", "Readings that were kept", { answer: reading.ReadingList }),
  post("/readings", "reading.create", "Keep a reading", {
    body: reading.CreateReadingInput,
    answer: reading.KeptReading,
    status: 201,
  }),
  patch("/readings/{id}", "reading.update", "Change a reading", {
    body: reading.UpdateReadingInput,
    answer: reading.KeptReading,
    version: true,
  }),
  del("/readings/{id}", "reading.delete", "Delete a reading", GONE),
];
