import type { ComponentProps } from "react";
import { joinClasses } from "./join-classes";

type PhotographThumbProps = Omit<ComponentProps<"img">, "alt" | "src" | "width" | "height"> & {
  src: string;
  width: number;
  height: number;
  alt: string;
  /** Width over height of the crop. Cropping is all that is ever done to a photograph. */
  ratio?: number;
};

/** A photograph small, in a list: a crop of the original on the viewing field. It identifies; nobody reads from it. */
export function PhotographThumb({ alt, ratio = 2.72, className, style, ...image }: PhotographThumbProps) {
  return (
    <span className={joinClasses("block overflow-hidden bg-field print-exact", className)}>
      {/* biome-ignore lint/performance/noImgElement: an optimiser must not resample what is being measured */}
      <img
        loading="lazy"
        decoding="async"
        draggable={false}
        {...image}
        alt={alt}
        style={{ aspectRatio: ratio, objectPosition: "50% 60%", ...style }}
        className="block h-auto w-full object-cover"
      />
    </span>
  );
}
