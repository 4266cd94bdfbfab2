import { joinClasses } from "@/components/ui/join-classes";

/** The name with a dotless i and a brass glint for its dot. Size it by the text size; a masthead uses `text-masthead`. */
export function Wordmark({ className }: { className?: string }) {
  return (
    <span
      className={joinClasses(
        "font-serif whitespace-nowrap",
        className ?? "text-[1.5625rem] leading-none font-medium tracking-[-0.015em]",
      )}
    >
      <span className="sr-only">Evenglint</span>
      <span aria-hidden="true">
        Evengl<span className="word-glint">ı</span>nt
      </span>
    </span>
  );
}
