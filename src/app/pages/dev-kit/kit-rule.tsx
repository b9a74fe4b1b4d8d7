import { type RuleTick, SteelRule } from "#src/components/steel-rule.tsx";
import { kitPicture } from "./kit-picture.ts";

const at = (month: number, date: number) => Date.UTC(2026, month - 1, date);

const ticks: RuleTick[] = [
  {
    date: at(1, 11),
    number: "1",
    label: "Frame rails cut and numbered",
    href: "#e1",
    major: true,
    kind: "entry",
  },
  { date: at(1, 29), number: "2", label: "Nodes tacked on the table", href: "#e2", kind: "entry" },
  {
    date: at(2, 21),
    number: "3",
    label: "Wishbones laid out from the upright",
    href: "#e3",
    major: true,
    kind: "entry",
  },
  { date: at(3, 3), number: "4", label: "Short arm coped at the wrong clock", href: "#e4", kind: "entry" },
  { date: at(3, 7), number: "5", label: "Second pair, marked from the heel", href: "#e5", kind: "entry" },
  { date: at(3, 10), number: "6", label: "Both sides tacked", href: "#e6", kind: "entry" },
  {
    date: at(4, 6),
    number: "7",
    label: "Steering tray and the rack on it",
    href: "#e7",
    major: true,
    kind: "entry",
  },
  { date: at(5, 9), number: "8", label: "Rods made up", href: "#e8", kind: "entry" },
  {
    date: at(5, 30),
    number: "9",
    label: "Rack set 22 mm too high: the choice is overturned",
    href: "#e9",
    kind: "overturned",
    backTo: at(4, 6),
  },
  { date: at(6, 20), number: "10", label: "New mounts, same rack", href: "#e10", kind: "entry" },
];

const photos = [at(1, 12), at(2, 22), at(2, 26), at(4, 7), at(6, 2)].map((date, index) => ({
  date,
  src: `${kitPicture}#${index}`,
  alt: "A weld bead with its heat tint",
  href: `#p${index}`,
}));

export function KitRule() {
  return (
    <div className="flex flex-col gap-10">
      <SteelRule
        label="Time line, five months"
        from={at(1, 5)}
        to={at(6, 30)}
        ticks={ticks}
        photos={photos}
      />
      <SteelRule
        label="Time line, five weeks"
        from={at(2, 18)}
        to={at(3, 25)}
        ticks={ticks.slice(2, 6)}
        photos={[]}
      />
      <SteelRule
        label="Time line, three years"
        from={Date.UTC(2023, 5, 1)}
        to={at(6, 30)}
        ticks={ticks
          .map((tick) => ({ ...tick, date: tick.date - (at(6, 20) - tick.date) * 5 }))
          .filter((tick) => tick.kind === "entry")}
        photos={[]}
      />
    </div>
  );
}
