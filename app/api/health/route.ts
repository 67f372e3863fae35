import { health } from "@/lib/services/health";

export const dynamic = "force-dynamic";

export async function GET(): Promise<Response> {
  const state = await health();
  return Response.json(state, { status: state.status === "failing" ? 503 : 200 });
}
