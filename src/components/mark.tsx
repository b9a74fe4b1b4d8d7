/** The shapes that go with a meaning, so that colour never speaks alone. Drawn on a 16 × 16 grid. */
export type MarkShape =
  | "post"
  | "half"
  | "turned"
  | "dot"
  | "chisel"
  | "cross"
  | "stroke"
  | "target"
  | "file";

const shapes: Record<MarkShape, string> = {
  post: "M2 13.5h12v1.5H2zM6.5 1h3v12.5h-3z",
  half: "M8 1a7 7 0 1 1 0 14A7 7 0 0 1 8 1zm0 1.75v10.5a5.25 5.25 0 0 0 0-10.5z",
  turned:
    "M13.4 4.2v6.3a3.4 3.4 0 0 1-3.4 3.4H4.6v-2H10a1.4 1.4 0 0 0 1.4-1.4V6.2H6.6v2.6L1.6 5.2l5-3.7v2.7z",
  dot: "M8 4.5a3.5 3.5 0 1 1 0 7 3.5 3.5 0 0 1 0-7z",
  chisel: "M5.2 1h5.6L8.9 10.4H7.1zM8 12a1.75 1.75 0 1 1 0 3.5A1.75 1.75 0 0 1 8 12z",
  cross: "M3.2 1.4 8 6.2l4.8-4.8 1.8 1.8L9.8 8l4.8 4.8-1.8 1.8L8 9.8l-4.8 4.8-1.8-1.8L6.2 8 1.4 3.2z",
  stroke: "M1 9.4 3.4 7l3.2 3.1L13.2 2 15 3.6 6.9 13.8z",
  target:
    "M7.2 0h1.6v3.1a5 5 0 0 1 4.1 4.1H16v1.6h-3.1a5 5 0 0 1-4.1 4.1V16H7.2v-3.1a5 5 0 0 1-4.1-4.1H0V7.2h3.1a5 5 0 0 1 4.1-4.1zM8 4.6a3.4 3.4 0 1 0 0 6.8 3.4 3.4 0 0 0 0-6.8zM8 7a1 1 0 1 1 0 2 1 1 0 0 1 0-2z",
  file: "M1.5 11.2 10.6 2l3.4 3.4-9.2 9.1-4 .7zM3.2 12l.8.8 7.6-7.4-.9-.9z",
};

export function Mark({ shape, className = "size-4" }: { shape: MarkShape; className?: string }) {
  return (
    <svg viewBox="0 0 16 16" className={`${className} shrink-0`} fill="currentColor" aria-hidden="true">
      <path d={shapes[shape]} fillRule="evenodd" />
    </svg>
  );
}
