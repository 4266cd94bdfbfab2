import type { Metadata } from "next";
import { CaseFilters } from "@/components/cases/case-filters";
import { CaseGrid } from "@/components/cases/case-grid";
import { Page, PageHead } from "@/components/shell/page";
import { ButtonLink } from "@/components/ui/button";
import { EmptyState } from "@/components/ui/empty-state";
import { authorizePage } from "@/lib/auth/current-actor";
import { countCases, listCaseSummaries } from "@/lib/cases/queries";
import { CaseFilter } from "@/lib/cases/schema";
import { database } from "@/lib/database";

export const metadata: Metadata = { title: "Case library" };

export default async function CasesPage({ searchParams }: PageProps<"/cases">) {
  const actor = await authorizePage("cases.read");
  const filter = CaseFilter.catch(CaseFilter.parse({})).parse(await searchParams);
  const [cases, total] = await Promise.all([
    listCaseSummaries(database(), actor.departmentId, filter),
    countCases(database(), actor.departmentId),
  ]);
  return (
    <Page>
      <PageHead
        title="Case library"
        lede={`${cases.length} of ${total} cases shown.`}
        actions={
          <ButtonLink kind="main" href="/cases/new">
            Add a case
          </ButtonLink>
        }
      />
      <CaseFilters filter={filter} />
      {cases.length > 0 ? (
        <CaseGrid cases={cases} />
      ) : (
        <EmptyState title="No case fits">
          Take a filter away, or add a case with a photograph and a reference.
        </EmptyState>
      )}
    </Page>
  );
}
