type Params = Readonly<Record<string, string | string[] | undefined>>;

/** A path with its query, as the address bar has it: where to come back to after signing in. */
export function pathWith(path: string, params: Params): string {
  const query = new URLSearchParams();
  for (const [name, value] of Object.entries(params))
    for (const one of Array.isArray(value) ? value : [value]) if (one !== undefined) query.append(name, one);
  const text = query.toString();
  return text ? `${path}?${text}` : path;
}
