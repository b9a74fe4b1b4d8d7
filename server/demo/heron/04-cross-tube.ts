import { caution, entryLink, h2, h3, i, list, p, photo, working } from "../document.ts";
import type { DemoEntry } from "../types.ts";

export const crossTube: DemoEntry = {
  slug: "a-cross-tube-set-five-millimetres-high",
  title: "A cross tube set five millimetres high",
  summary:
    "The pedal tray wants a cross tube nearly level with the top of the rails. An offset cope has four different depths, and I cut the first one upside down.",
  stage: "Frame",
  at: "2026-03-22T17:55:00Z",
  state: "public",
  content: [
    p(
      "The pedals bolt to a tray, and the tray is 3 mm plate. It lies on a 25 mm cross tube that runs between the two tray rails, which are 38 mm. If the cross tube sits in the middle of the rails its top is 6.5 mm below theirs, and the tray has to be joggled to clear them. If it sits level with their tops, the joint is right at the edge of the rail. I wanted something between the two.",
    ),
    h2("The limit first"),
    p(
      "The most you can raise a 25 mm tube on a 38 mm one before it runs past the edge is half the difference: 6.5 mm. At that the outer side of the branch just grazes the rail, and the tip there reaches right to the height of the rail's axis. There is nothing to weld to but a tangent. I settled on 5 mm. That leaves the cross tube 1.5 mm below the rail tops, which is half the tray's thickness, and still puts real metal under the bead.",
    ),
    working("heron-offset", "saddle-cope", "Tray cross tube, set high", {
      headerOd: 38,
      branchOd: 25,
      branchWall: 1.5,
      angle: 90,
      offset: 5,
    }),
    h2("Four lines, three depths"),
    p(
      "I am used to a cope being alike left and right. This one is not. With the high side at the 90° line, nothing comes off there. On the low side, at 270°, it is 10.1 mm. Front and back take 10.9 mm each. And the deepest place is none of the four: it is 11.6 mm, a little toward the low side from front and back, where the branch crosses the fullest part of the rail.",
    ),
    h3("What to write on the tube"),
    list(
      "Draw the four quarter lines right along the tube, not just at the end.",
      "Write UP on the 90° line. Write it on the paper as well.",
      "The other end of the same tube takes the same sheet. At a right angle front and back are alike, so only UP has to be up. At a slant they would not be, and the far end would want its own sheet.",
    ),
    p(
      "I did not write UP on the first one. I held the tube in the vice with a line at the top, wrapped the paper with its datum on that line and cut a lovely cope. But the datum on the sheet is the heel, which is the front. When I offered it up, the tube sat 5 mm forward instead of 5 mm high. It took me a cup of tea to see it. That piece is now two door pegs.",
    ),
    photo(
      "frame-side",
      "The tray goes in at the front, at the right-hand end here, on the rails halfway up.",
    ),
    caution(
      "The pedals push on this tray. A driver standing on a brake can push far harder than an arm can pull, so I am going to ask somebody who does this for a living to look at the joint and the tray before anyone drives it.",
    ),
    h2("A convenience I should be careful of"),
    p(
      "The tray makes a good flat place in an awkward part of the car. I have already caught myself thinking of other things that could bolt to it. The steering rack, for one. I have not drawn that yet, and I am writing it down so that I notice when I do it: a thing should go where the ",
      i("drawing"),
      " wants it and not where there is already a plate.",
    ),
    p(
      "(If you are reading this in order, you may like to skip to ",
      entryLink("how well I took my own advice", "heron", "the-rack-goes-on-the-tray"),
      ".)",
    ),
  ],
  quoted: [
    { text: "6.5 mm", sum: () => (38 - 25) / 2 },
    { text: "1.5 mm", sum: () => 19 - (5 + 12.5) },
    { text: "10.1 mm", working: "heron-offset", result: "sideDepth.at270" },
    { text: "10.9 mm", working: "heron-offset", result: "heelDepth" },
    { text: "11.6 mm", working: "heron-offset", result: "deepest" },
  ],
};
