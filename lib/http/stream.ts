import "server-only";

/** Answers text piece by piece: the next one is made when the reader has taken the last; one that leaves ends it. */
export const streamText = (
  pieces: AsyncGenerator<string>,
  headers: Readonly<Record<string, string>>,
): Response => {
  const encoder = new TextEncoder();
  const stream = new ReadableStream<Uint8Array>({
    async pull(controller) {
      const { value, done } = await pieces.next();
      if (done) controller.close();
      else if (value !== "") controller.enqueue(encoder.encode(value));
    },
    async cancel() {
      await pieces.return(undefined);
    },
  });
  return new Response(stream, { headers });
};
