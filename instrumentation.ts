export const register = async (): Promise<void> => {
  if (process.env.NEXT_RUNTIME !== "nodejs") return;
  const { startUp } = await import("@/lib/http/start-up");
  await startUp();
};
