import type { Metadata } from "next";
import { Specimens } from "@/components/design/specimens";
import { developmentOnly } from "@/lib/web/development";

export const metadata: Metadata = { title: "Design" };
export const dynamic = "force-dynamic";

/** Every primitive in every state, in both themes beside each other. */
export default function DesignPage() {
  developmentOnly();
  return (
    <main className="grid xl:grid-cols-2">
      <h1 className="sr-only">Every primitive in every state</h1>
      {(["light", "dark"] as const).map((theme) => (
        <div key={theme} data-theme={theme} className="grid content-start gap-6 p-6">
          <h2 className="text-2xl font-bold">{theme === "light" ? "Light" : "Dark"}</h2>
          <Specimens theme={theme} />
        </div>
      ))}
    </main>
  );
}
