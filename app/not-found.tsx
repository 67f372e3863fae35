import Link from "next/link";
import { PublicShell } from "@/components/layout/public-shell";

export default function NotFound() {
  return (
    <PublicShell>
      <h1 className="text-2xl font-bold">Nothing is here</h1>
      <p>Either the address is wrong, or what it names is not yours to see.</p>
      <Link href="/" className="font-semibold text-settled underline">
        To your first screen
      </Link>
    </PublicShell>
  );
}
