import Link from "next/link";

/** The caution that stands on every page, in short. */
export function Foot() {
  return (
    <footer className="border-t border-hair text-small text-ink-2">
      <p className="mx-auto max-w-page px-margin py-4">
        For quality assurance and training only: not for diagnosis or treatment. Local protocols and licensed practice
        decide.{" "}
        <Link href="/cautions" className="whitespace-nowrap">
          Cautions and safety card
        </Link>
        {" · "}
        <Link href="/method">Method</Link>
      </p>
    </footer>
  );
}
