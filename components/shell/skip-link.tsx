/** The first stop of the Tab key on every page. Every page has its landmark `main` with the id "main". */
export function SkipLink() {
  return (
    <a
      href="#main"
      className="absolute -left-[999px] z-30 bg-ink px-4 py-2.5 text-on-ink no-underline focus:top-3 focus:left-4 print:hidden"
    >
      Skip to the page
    </a>
  );
}
