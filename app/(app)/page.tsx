import { redirect } from "next/navigation";
import { signedInActor } from "@/lib/auth/current-actor";
import { LANDING } from "@/lib/auth/roles";

/** The way to the page of one's role. */
export default async function HomePage() {
  const { role } = await signedInActor();
  redirect(LANDING[role]);
}
