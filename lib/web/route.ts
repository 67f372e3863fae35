import "server-only";
import type { NextRequest } from "next/server";
import type { Verb } from "@/lib/services/command";
import { contextOf } from "./context";
import { toProblem } from "./problem";

type RouteContext = { params: Promise<Record<string, string>> };

/** A read for the client: the address' parts and parameters are the input, JSON or a problem is the answer. */
export function readRoute<R>(verb: Verb<R>) {
  return async (request: NextRequest, { params }: RouteContext): Promise<Response> => {
    const context = await contextOf();
    try {
      const input = { ...Object.fromEntries(request.nextUrl.searchParams), ...(await params) };
      return Response.json(await verb(context, input), { headers: { "cache-control": "no-store" } });
    } catch (error) {
      return toProblem(error, context.requestId ?? "");
    }
  };
}
