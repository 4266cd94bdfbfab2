import type { Role } from "@/lib/auth/roles";
import type { ReadingHabit } from "./demo-model";

/** The demo runs on loopback with invented people, so one word opens every account. */
export const DEMO_PASSWORD = "evenglint-demo";

export const DEMO_DEPARTMENT = { name: "Quillmere Eye Department", timeZone: "Europe/London" };

export type DemoPerson = { name: string; email: string; roles: Role[]; habit?: ReadingHabit };

/** Everybody is invented. Those who read have a habit, which says how they err. */
export const DEMO_PEOPLE: DemoPerson[] = [
  { name: "Ines Farrowby", email: "i.farrowby@quillmere.example", roles: ["lead"] },
  { name: "Beatrix Oldmere", email: "b.oldmere@quillmere.example", roles: ["reviewer", "admin"] },
  { name: "Tobias Wrenfield", email: "t.wrenfield@quillmere.example", roles: ["admin"] },
  { name: "Adaeze Winmarsh", email: "a.winmarsh@quillmere.example", roles: ["examiner"], habit: "steady" },
  { name: "Callum Orrish", email: "c.orrish@quillmere.example", roles: ["examiner"], habit: "sliding" },
  { name: "Devraj Mintern", email: "d.mintern@quillmere.example", roles: ["examiner"], habit: "ordinary" },
  { name: "Hana Velden", email: "h.velden@quillmere.example", roles: ["examiner"], habit: "misses-verticals" },
  { name: "Joon Estwick", email: "j.estwick@quillmere.example", roles: ["examiner"], habit: "ordinary" },
  { name: "Leila Brackmoor", email: "l.brackmoor@quillmere.example", roles: ["examiner"], habit: "ordinary" },
  { name: "Marta Quiresh", email: "m.quiresh@quillmere.example", roles: ["examiner"], habit: "ordinary" },
  { name: "Piotr Lankwell", email: "p.lankwell@quillmere.example", roles: ["examiner"], habit: "ordinary" },
  { name: "Ayla Fenwright", email: "a.fenwright@quillmere.example", roles: ["trainee"], habit: "learning" },
  { name: "Emil Starrow", email: "e.starrow@quillmere.example", roles: ["trainee"], habit: "reverses-then-learns" },
  { name: "Noor Ashgrove", email: "n.ashgrove@quillmere.example", roles: ["trainee"], habit: "learning" },
];
