import { redirect } from "next/navigation";
import { FIRST_SCREEN } from "@/lib/domain/shared/roles";
import { getFrame } from "@/lib/services/company/get-frame";
import { read } from "@/lib/web/page";

/** Everybody goes to the first screen of their role; strangers to the sign-in page. */
export default async function Home() {
  const { role } = await read(getFrame);
  redirect(FIRST_SCREEN[role]);
}
