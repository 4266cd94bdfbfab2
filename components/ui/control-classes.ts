/** The shared look of everything one types into or picks from. */
export const CONTROL_CLASSES =
  "block w-full min-h-touch rounded-control border border-edge bg-sheet px-3 py-2 text-body leading-[1.3] text-ink " +
  "hover:border-ink aria-invalid:border-oxide aria-invalid:inset-ring-1 aria-invalid:inset-ring-oxide " +
  "disabled:border-dashed disabled:bg-transparent disabled:text-ink-3";
