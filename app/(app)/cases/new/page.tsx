import type { Metadata } from "next";
import { NewCaseForm } from "@/components/cases/new-case-form";
import { Page, PageHead } from "@/components/shell/page";
import { Crumb } from "@/components/ui/crumb";
import { authorizePage } from "@/lib/auth/current-actor";

export const metadata: Metadata = { title: "Add a case" };

export default async function NewCasePage() {
  await authorizePage("cases.write");
  return (
    <Page>
      <PageHead
        crumb={<Crumb steps={[{ label: "Case library", href: "/cases" }, { label: "Add a case" }]} />}
        title="Add a case"
      />
      <NewCaseForm />
    </Page>
  );
}
