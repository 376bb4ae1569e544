import { QueryClient } from "@tanstack/react-query";
import { ApiProblem } from "@/lib/client/api";

/** Reads try again when the server is busy or out of reach; a refusal is final. Changes never repeat by themselves. */
export const makeQueryClient = (): QueryClient =>
  new QueryClient({
    defaultOptions: {
      queries: {
        staleTime: 30_000,
        refetchOnWindowFocus: true,
        retry: (failures, cause) => cause instanceof ApiProblem && cause.passing && failures < 3,
        retryDelay: (attempt, cause) =>
          cause instanceof ApiProblem && cause.retryAfterSeconds !== null
            ? cause.retryAfterSeconds * 1000
            : Math.min(500 * 2 ** attempt, 5_000),
      },
      mutations: { retry: false },
    },
  });
