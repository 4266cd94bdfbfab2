/** "n of m" as one row of ticks in a table; the number beside it says the same in text. */
export function ProgressTicks({ count, done }: { count: number; done: number }) {
  return (
    <span aria-hidden="true" className="flex h-5 min-w-50 items-end border-b border-edge px-1.5">
      {Array.from({ length: count }, (_, index) => (
        <span
          // biome-ignore lint/suspicious/noArrayIndexKey: a tick is its position and holds no state
          key={index}
          className="flex flex-1 items-end justify-center"
        >
          <span className={index < done ? "h-4 w-0.75 bg-ink" : "h-1.75 w-px bg-tick"} />
        </span>
      ))}
    </span>
  );
}
