export const DEMO_PASSWORD = "flitchbook-demo";

export type DemoAccount = "admin" | "librarian" | "engineer" | "designer";
