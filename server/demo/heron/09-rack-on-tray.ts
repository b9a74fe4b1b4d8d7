import { caution, entryLink, h2, list, p, photo, table } from "../document.ts";
import type { DemoEntry } from "../types.ts";
import { corner, rackOnTray, row } from "./corner.ts";

/** Cross tube set high, half its diameter, tray, clamp block: from the rail's centre to the rack's. */
export const rackAboveRail = 5 + 12.5 + 3 + 23.5;

export const rackOnTheTray: DemoEntry = {
  slug: "the-rack-goes-on-the-tray",
  title: "The rack goes on the tray",
  summary:
    "The steering rack is in, on the pedal tray, with slots to shift it fore and aft. It is 22 mm higher than I drew it, and I have decided to live with that.",
  stage: "Steering",
  at: "2026-08-23T18:45:00Z",
  state: "public",
  content: [
    p(
      "The rack is in and the wheels turn when the shaft turns. I steered the car round the shed on two trolleys and made the noises. I shall set down how it is mounted, and also the thing about it that I am not quite easy with.",
    ),
    photo(
      "plate-slots",
      "One of the two rack brackets. The slots let the rack move fore and aft, not up and down.",
    ),
    h2("Where I drew it"),
    p(
      "The rods that push the wheels have to swing in step with the wishbones, or the wheels steer themselves when the car goes over a bump. For these wishbones that puts the inner rod joints 208 mm above the ground, 230 mm from the middle of the car. I found the height by drawing: a line from the outer rod joint to the point where the lines of the two wishbones would meet if they went on for ever. The rod should lie close to that line.",
    ),
    table(
      ["Point", "Fore", "Out", "Up"],
      row("Outer rod joint", corner.rodOuter),
      row("Inner rod joint, as drawn", corner.rodInner),
      row("Inner rod joint, as built", rackOnTray),
    ),
    h2("Where it is"),
    p(
      "As drawn, the rack hangs in the air, in front of the pedals, 22 mm above the middle of the tray rails. There is nothing there to bolt it to. There is a perfectly good tray just above. So I added up what I would get if I clamped the rack on top of that:",
    ),
    list(
      [
        "the cross tube is set 5 mm above the rail's middle (",
        entryLink("here is why", "heron", "a-cross-tube-set-five-millimetres-high"),
        ")",
      ],
      "half of its 25 mm diameter is 12.5 mm",
      "the tray is 3 mm",
      "the clamp blocks hold the rack's middle 23.5 mm above whatever they stand on",
    ),
    p(
      "That makes 44 mm above the rail where I wanted 22 mm. The rack is 22 mm too high, and it slopes the rods down toward the wheels where they should slope up a little.",
    ),
    h2("Why I left it there"),
    p(
      "My reasons, as they stood on the evening: the tray is stiff. The shaft has a straight run to it. The blocks were made. A bracket to hang the rack lower would have to reach past the pedals, and I could not see how without moving the brake. And 22 mm did not seem much, against rods that are as long as my forearm.",
    ),
    p(
      "I bounced the front by hand and looked at the wheels. I could not see them toe either way. I will admit that I was looking with the intention of not seeing it.",
    ),
    caution(
      "Steering is the part where a mistake has no second chance. The bolts are only in finger-tight, with ordinary nuts. Before the car moves under its own power the mounts, the rods and every joint get looked over by an engineer who has not been listening to me.",
    ),
    p(
      "So the choice is made, and the reason is written down: the tray was there. If you think that is a poor reason, tell me why. A sum would help more than an adjective.",
    ),
    p(
      "Next I want the upper wishbones finished, so that the wheel can go through its full travel on packing blocks and I can measure instead of bounce.",
    ),
  ],
  quoted: [
    { text: "44 mm", sum: () => rackAboveRail },
    { text: "22 mm", sum: () => rackAboveRail - 22 },
    { text: "208 mm", sum: () => corner.rodInner[2] },
    { text: "12.5 mm", sum: () => 25 / 2 },
  ],
};
