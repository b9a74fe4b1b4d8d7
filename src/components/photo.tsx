import { clsx } from "clsx";
import type { ReactNode } from "react";
import { placeholderBackground } from "./placeholder-background.ts";

export type PhotoSource = { type: "image/avif" | "image/webp"; files: { src: string; width: number }[] };

type PhotoProps = {
  src: string;
  alt: string;
  width: number;
  height: number;
  sources?: PhotoSource[];
  /** The CSS `sizes` of the place it stands in. */
  sizes?: string;
  /** Base64 thumbhash, shown until the picture is there. */
  thumbhash?: string;
  caption?: ReactNode;
  /** The first picture of a page: loaded at once and first. */
  priority?: boolean;
  /** Cut to this shape, for a list of pictures of unlike shapes. */
  crop?: "3/2" | "1/1";
  className?: string;
};

const crops = { "3/2": "aspect-[3/2] object-cover", "1/1": "aspect-square object-cover" };

const srcSet = (files: PhotoSource["files"]) => files.map((file) => `${file.src} ${file.width}w`).join(", ");

/** A photo in its own shape, edge to edge on a phone, caption under it. */
export function Photo(props: PhotoProps) {
  const { src, alt, width, height, sources = [], sizes = "(min-width: 60rem) 51rem, 100vw" } = props;
  const { thumbhash, caption, priority, crop, className } = props;
  return (
    <figure className={clsx("not-prose", className)}>
      <picture>
        {sources.map((source) => (
          <source key={source.type} type={source.type} srcSet={srcSet(source.files)} sizes={sizes} />
        ))}
        <img
          src={src}
          alt={alt}
          width={width}
          height={height}
          decoding="async"
          loading={priority ? "eager" : "lazy"}
          fetchPriority={priority ? "high" : undefined}
          className={clsx("w-full bg-grey-wash sm:rounded", crop ? crops[crop] : "h-auto")}
          style={thumbhash ? placeholderBackground(thumbhash) : undefined}
        />
      </picture>
      {caption ? (
        <figcaption className="mt-2 max-w-measure font-sans text-xs text-ink-soft max-sm:px-4">
          {caption}
        </figcaption>
      ) : null}
    </figure>
  );
}
