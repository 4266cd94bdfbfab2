import "server-only";
import type { Knex } from "knex";

/** The kappa below which the department does not let a person read alone. */
export async function findKappaFloor(db: Knex, departmentId: string): Promise<number> {
  const row = await db("departments").where({ id: departmentId }).first("kappa_floor");
  return Number(row?.kappa_floor ?? 0);
}

export type DeskNotice = { departmentName: string; isDemo: boolean };

/** For the sign-in page of an installation with one department; null with none or several. */
export async function findOnlyDepartment(db: Knex): Promise<DeskNotice | null> {
  const rows = await db("departments").limit(2).select("name", "is_demo");
  const [row] = rows;
  return rows.length === 1 && row ? { departmentName: row.name, isDemo: row.is_demo } : null;
}
