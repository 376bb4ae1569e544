/** What the sign-in page names while the program is the demo; the seed makes these accounts. */
export const DEMO = {
  firm: "Harrow & Tide Fabrication",
  password: "flitchbook-demo",
  people: [
    { email: "engineer@harrowtide.example", role: "engineer" },
    { email: "librarian@harrowtide.example", role: "librarian" },
    { email: "designer@harrowtide.example", role: "designer" },
    { email: "admin@harrowtide.example", role: "admin" },
  ],
} as const;
