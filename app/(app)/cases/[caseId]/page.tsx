import type { Metadata } from "next";
import { CasePage } from "@/components/cases/case-page";
import { Page } from "@/components/shell/page";
import { authorizePage } from "@/lib/auth/current-actor";
import { findCaseDetail } from "@/lib/cases/queries";
import { CaseParams } from "@/lib/cases/schema";
import { database } from "@/lib/database";
import { pageParams, pageResult } from "@/lib/http/page";

export const metadata: Metadata = { title: "Case" };

export default async function CaseRoutePage({ params }: PageProps<"/cases/[caseId]">) {
  const actor = await authorizePage("cases.read");
  const { caseId } = pageParams(await params, CaseParams);
  const detail = await pageResult(findCaseDetail(database(), actor.departmentId, caseId));
  return (
    <Page>
      <CasePage initial={detail} zone={actor.timeZone} />
    </Page>
  );
}
