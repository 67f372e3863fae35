import { randomUUID } from "node:crypto";
import { type NextRequest, NextResponse } from "next/server";

/** Headers only: a request id for log and error, and the path for the way back after signing in. Never the lock. */
export function proxy(request: NextRequest) {
  const headers = new Headers(request.headers);
  const id = randomUUID();
  headers.set("x-request-id", id);
  headers.set("x-path", request.nextUrl.pathname + request.nextUrl.search);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set("x-request-id", id);
  return response;
}

export const config = { matcher: ["/((?!_next/static|_next/image|icon.svg|favicon.ico).*)"] };
