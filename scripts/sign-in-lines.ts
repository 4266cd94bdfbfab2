import { DEMO_PASSWORD, DEMO_PEOPLE } from "../db/seeds/demo-people";

/** The invented people that the demo can be opened as, one for each combination of roles. */
export function signInLines(): string[] {
  const perRoles = new Map(DEMO_PEOPLE.toReversed().map((person) => [person.roles.join(", "), person]));
  const people = [...perRoles.values()].toReversed();
  const width = Math.max(...people.map(({ email }) => email.length));
  const lines = people.map(({ email, roles }) => `  ${email.padEnd(width)}  ${roles.join(", ")}`);
  return [`Sign in to the demo, which is invented, with the password ${DEMO_PASSWORD} as`, ...lines];
}
