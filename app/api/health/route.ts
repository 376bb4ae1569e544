/** health.show touches nothing: the process answers. */
export const GET = (): Response =>
  Response.json({ status: "ok" }, { headers: { "cache-control": "no-store" } });
