import "server-only";
import { z } from "zod";
import { VERBS } from "@/lib/permissions";
import { Problem } from "@/lib/schemas/common";
import { OPERATIONS } from "./api-table";
import type { Operation } from "./operation";

type Json = Readonly<Record<string, unknown>>;

/** JSON Schema of what goes in (before transforms) or comes out. */
const schemaOf = (schema: z.ZodType, io: "input" | "output"): Json => {
  const { $schema: _dialect, ...rest } = z.toJSONSchema(schema, { io, unrepresentable: "any" });
  return rest;
};

const pathParameters = (path: string) =>
  [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => ({
    name,
    in: "path",
    required: true,
    schema: name === "n" ? { type: "integer", minimum: 1 } : { type: "string" },
  }));

const queryParameters = (query: z.ZodObject | undefined) => {
  if (query === undefined) return [];
  const { properties = {}, required = [] } = schemaOf(query, "input") as {
    properties?: Record<string, Json>;
    required?: string[];
  };
  return Object.entries(properties).map(([name, schema]) => ({
    name,
    in: "query",
    required: required.includes(name),
    schema,
  }));
};

const problem = (description: string) => ({
  description,
  content: { "application/problem+json": { schema: { $ref: "#/components/schemas/Problem" } } },
});

const success = ({ answer, media, status, method }: Operation) => {
  const description = status === 204 || status === 202 ? "Done" : "The answer";
  if (answer) return { description, content: { "application/json": { schema: schemaOf(answer, "output") } } };
  if (media && method === "GET") return { description, content: { [media]: {} } };
  return { description };
};

const requestBody = ({ body, media, method }: Operation) => {
  if (body)
    return {
      requestBody: { required: true, content: { "application/json": { schema: schemaOf(body, "input") } } },
    };
  return media && method !== "GET" ? { requestBody: { required: true, content: { [media]: {} } } } : {};
};

const ifMatch = {
  name: "If-Match",
  in: "header",
  required: true,
  description: "ETag of the state the change was made from",
  schema: { type: "string" },
};

const isOpen = ({ verb }: Operation): boolean => "public" in VERBS[verb];

const described = (operation: Operation): Json => {
  const { method, path, verb, summary, query, version } = operation;
  return {
    operationId: `${verb}.${method.toLowerCase()}${path.replace(/[^A-Za-z0-9]+/g, "-")}`,
    summary,
    ...(isOpen(operation) && { security: [] }),
    parameters: [...pathParameters(path), ...queryParameters(query), ...(version ? [ifMatch] : [])],
    ...requestBody(operation),
    responses: {
      [String(operation.status ?? 200)]: success(operation),
      ...(isOpen(operation) ? {} : { 401: problem("Not signed in"), 403: problem("Not allowed") }),
      ...(path.includes("{") && { 404: problem("No such thing here") }),
      ...(version && { 412: problem("Changed by somebody else"), 428: problem("Version missing") }),
      ...(operation.body && { 422: problem("Not valid; issues name the fields") }),
      503: problem("Busy; nothing was saved"),
    },
  };
};

/** The description of the API as OpenAPI 3.1, made from the schemas the verbs parse with. */
export const openApiDocument = (): Json => {
  const paths: Record<string, Record<string, Json>> = {};
  for (const operation of OPERATIONS) {
    const path = (paths[operation.path] ??= {});
    path[operation.method.toLowerCase()] = described(operation);
  }
  return {
    openapi: "3.1.0",
    info: {
      title: "Flitchbook",
      version: "1",
      description:
        "Lengths in mm, areas in mm², moduli in mm³, second moments in mm⁴, mass in kg/m, stresses in MPa. Figures say nothing about buckling, connections, fatigue or fire: local codes and a licensed engineer decide.",
    },
    servers: [{ url: "/api/v1" }],
    security: [{ session: [] }, { token: [] }],
    paths,
    components: {
      securitySchemes: {
        session: { type: "apiKey", in: "cookie", name: "flitchbook" },
        token: { type: "http", scheme: "bearer" },
      },
      schemas: { Problem: schemaOf(Problem, "output") },
    },
  };
};
