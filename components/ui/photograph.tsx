import type { ComponentProps, ReactNode } from "react";
import { joinClasses } from "./join-classes";

type PhotographProps = Omit<ComponentProps<"img">, "alt" | "src" | "width" | "height"> & {
  src: string;
  width: number;
  height: number;
  /** Neutral while reading: it identifies the picture and tells nothing of what is in it. */
  alt: string;
  /** Controls under the photograph; they never lie over it. */
  tools?: ReactNode;
  /** Class of the viewing field. */
  fieldClassName?: string;
};

/**
 * A whole photograph on the viewing field: the same grey in both themes, never tinted, rounded or covered.
 * The patient's right eye is on the viewer's left, so R stands left. On a phone R and L stand above.
 */
export function Photograph({ alt, tools, fieldClassName, className, ...image }: PhotographProps) {
  return (
    <div className={joinClasses("bg-field text-on-field print-exact", fieldClassName)}>
      <div className="grid grid-cols-2 items-center sm:grid-cols-[3.5rem_minmax(0,1fr)_3.5rem] sm:py-3.5 lg:grid-cols-[6rem_minmax(0,1fr)_6rem]">
        <Side letter="R" words="patient’s right" className="max-sm:justify-start" />
        {/* biome-ignore lint/performance/noImgElement: an optimiser must not resample what is being measured */}
        <img
          draggable={false}
          {...image}
          alt={alt}
          className={joinClasses(
            "mx-auto block h-auto max-w-full max-sm:order-3 max-sm:col-span-2 max-sm:w-full",
            className,
          )}
        />
        <Side letter="L" words="patient’s left" className="max-sm:order-2 max-sm:justify-end" />
      </div>
      {tools}
    </div>
  );
}

function Side({ letter, words, className }: { letter: "R" | "L"; words: string; className: string }) {
  return (
    <p
      className={joinClasses(
        "flex items-baseline gap-2 px-3 py-1 text-center text-small leading-tight sm:flex-col sm:items-center sm:gap-1 sm:px-0 sm:py-0",
        className,
      )}
    >
      <b className="font-serif text-[1.5rem] leading-none font-normal sm:text-[2.75rem] lg:text-[4rem]">{letter}</b>
      <span className="sm:max-lg:sr-only">{words}</span>
    </p>
  );
}
