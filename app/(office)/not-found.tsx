import type { Metadata } from "next";
import { NothingHere } from "@/components/layout/nothing-here";

export const metadata: Metadata = { title: "Nothing is here" };

/** Inside the shell, so that whoever typed wrong goes on from the navigation. */
export default function NotFound() {
  return <NothingHere />;
}
