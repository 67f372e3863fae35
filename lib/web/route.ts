import "server-only";
import type { NextRequest } from "next/server";
import { AppError } from "@/lib/errors";
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

/** A write by the client. Only JSON: what another site can post with our cookie is never that. */
export function writeRoute<R>(verb: Verb<R>) {
  return async (request: NextRequest, { params }: RouteContext): Promise<Response> => {
    const context = await contextOf();
    try {
      if (!request.headers.get("content-type")?.startsWith("application/json"))
        throw new AppError("invalid", "Only JSON is taken here");
      const body = await request.json().catch(() => {
        throw new AppError("invalid", "That is not JSON");
      });
      return Response.json(await verb(context, { ...body, ...(await params) }));
    } catch (error) {
      return toProblem(error, context.requestId ?? "");
    }
  };
}
