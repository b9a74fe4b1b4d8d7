/** The name, with the stick that draws the line under it. */
export function Wordmark() {
  return (
    <span className="inline-flex flex-col leading-none">
      <span className="text-lg leading-none font-[720] tracking-[-0.01em] [font-stretch:112%]">
        Soapstone
      </span>
      <svg viewBox="0 0 128 12" className="mt-0.5 h-3 w-32" aria-hidden="true">
        <path
          className="fill-chalk"
          opacity="0.92"
          d="M0 6.4 9 5.3l21 .6 24-1 28 .9 24-1.2 1.6 2.1-2.3 1.3-26-.2-25 1-22-.6-19 .9-13-.7z"
        />
        <path className="fill-chalk" d="m106 7.6 2.4-3L126 .6l2 3.4-17.6 5.2-3.4.4z" />
        <path className="fill-plate" opacity="0.35" d="m110.4 9.2-3.4.4-1-2 2.4-.6z" />
      </svg>
    </span>
  );
}
