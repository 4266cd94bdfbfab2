import type { Metadata } from "next";
import { Foot } from "@/components/shell/foot";
import { Page, PageHead } from "@/components/shell/page";
import { RunningHead } from "@/components/shell/running-head";
import { ButtonLink } from "@/components/ui/button";

export const metadata: Metadata = { title: "Page not found" };

/** Also what a page answers for a row that belongs to another department: the two must look the same. */
export default function NotFound() {
  return (
    <>
      <RunningHead homeHref="/" />
      <Page>
        <PageHead
          title="There is no page here"
          lede="The address may be mistyped, what it named may have been removed, or it belongs to a department you are not in."
        />
        <ButtonLink href="/" kind="main">
          Go to the first page
        </ButtonLink>
      </Page>
      <Foot />
    </>
  );
}
