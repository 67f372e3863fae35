import Link from "next/link";
import { Button } from "@/components/ui/button";

export function NothingHere() {
  return (
    <div className="grid gap-6">
      <div className="grid gap-3">
        <h1 className="text-2xl font-bold">Nothing is here</h1>
        <p>Either the address is wrong, or what it names is not yours to see.</p>
      </div>
      <div>
        <Button asChild variant="primary" size="thumb">
          <Link href="/">To your first screen</Link>
        </Button>
      </div>
    </div>
  );
}
