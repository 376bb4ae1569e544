/** Where to go after signing in: a path of this site and nothing else, so that a link cannot lead a person away. */
export function wantedPath(next: string | string[] | undefined): string {
  if (typeof next !== "string") return "/rack";
  const base = "https://book.invalid";
  if (!next.startsWith("/") || !URL.canParse(next, base)) return "/rack";
  const url = new URL(next, base);
  if (url.origin !== base || url.pathname === "/sign-in" || url.pathname.startsWith("/api/")) return "/rack";
  return url.pathname + url.search + url.hash;
}
