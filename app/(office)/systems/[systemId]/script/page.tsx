import type { Metadata } from "next";
import { ScriptView } from "@/components/systems/script-view";
import { getScript } from "@/lib/services/sequences/get-script";
import { read } from "@/lib/web/page";

export const metadata: Metadata = { title: "Test script" };

export default async function ScriptPage({ params }: PageProps<"/systems/[systemId]/script">) {
  return <ScriptView script={await read(getScript, await params)} />;
}
