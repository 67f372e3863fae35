import { queryOptions } from "@tanstack/react-query";
import type { Found } from "@/lib/domain/shared/found";
import { getJson } from "./get-json";

export const findQuery = (q: string) =>
  queryOptions({
    queryKey: ["find", q],
    queryFn: ({ signal }) => getJson<Found>(`/api/find?q=${encodeURIComponent(q)}`, signal),
    enabled: q.trim().length >= 2,
  });
