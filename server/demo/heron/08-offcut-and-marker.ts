import { b, caution, h2, h3, list, p, photo, photos, quote, steps, working } from "../document.ts";
import type { DemoEntry } from "../types.ts";

export const offcutAndMarker: DemoEntry = {
  slug: "a-cope-with-an-offcut-and-a-marker",
  title: "A cope with an offcut and a marker",
  summary:
    "Tam asked how to mark a cope with no printer and no hole saw. All it takes is a square, a strip of paper, a marker and a bit of the other tube.",
  stage: "Front suspension",
  at: "2026-07-19T15:00:00Z",
  state: "public",
  content: [
    quote(
      "I have no printer and no hole saw. I have one marker and a box of offcuts. Can a person mark one of these by hand, or do I have to buy something? – Tam",
    ),
    p(
      "You can, Tam. People did it for a long time before there were printers. It is slower, and you file more. For a right-angle joint in a log stand it is all you need.",
    ),
    photo("offcuts", "The box in question. This one is mine, but I expect yours looks the same."),
    h2("First, four lines"),
    p(
      "I will do it for the commonest pair in the frame I have: a 32 mm branch on a 38 mm header, square. Put your own sizes into the working and the depths change with them.",
    ),
    working("heron-by-hand", "saddle-cope", "By hand: 32 on 38, square", {
      headerOd: 38,
      branchOd: 32,
      branchWall: 2,
      angle: 90,
    }),
    steps(
      "Cut the end of the branch square. If it is not square nothing after this can be right, so check it with a square from two sides.",
      "Wrap a strip of paper round the tube, mark where it meets itself and fold the length in half twice. You have a ruler with four equal parts. They come to 25.1 mm each.",
      "Draw four lines along the tube with it: front, side, back, side.",
      "On the front and back lines, measure 8.8 mm from the end and make a mark. That is the bottom of the cope. On the two side lines the mark is at the very end: nothing comes off there.",
    ),
    h2("Then the offcut"),
    p(
      "Take a short offcut of the header with a clean, square end. Stand that end on the front line of the branch, as if the header were going to come straight out at you. Slide it until its rim passes through the 8.8 mm mark. Its middle should now be 10.2 mm beyond the end of the branch. If it is not, one of your marks is out.",
    ),
    p(
      "The rim of the offcut is now the curve, seen from the front. It only touches the branch along one line, so at the sides you must sight straight down it and follow with the marker. Draw the front half. Turn the tube over and do the back. The two curves meet at the end, on the side lines.",
    ),
    photos(
      photo(
        "cope-90",
        "What you are after at a right angle: both sides alike, two points a quarter turn away.",
      ),
      photo("cope-unequal", "And on a header a good deal larger than the branch. The curve is hardly there."),
    ),
    h3("When the header is much bigger"),
    p(
      "The bigger the header, the flatter the curve. In the second picture it is 92 mm and the branch is 40 mm. Only 4.6 mm comes off. You could nearly do that one with a file and patience.",
    ),
    working("heron-by-hand-large", "saddle-cope", "By hand: 40 on 92, square", {
      headerOd: 92,
      branchOd: 40,
      branchWall: 3,
      angle: 90,
    }),
    h2("Cutting and fitting"),
    list(
      "Saw two straight cuts on the waste side that meet below the curve, and take out the wedge.",
      "File to the line with a half-round file, from the outside in.",
      "The bore needs more than the outside: the inner edge goes back about 2.6 mm further on this one. File it away until the outer edge is what touches.",
      [
        "Chalk the header, push the branch on, twist a hair, look. File where the chalk is. ",
        b("Ten goes is normal."),
      ],
    ),
    caution(
      "Clamp the tube. A short tube in one hand and a saw in the other is how people cut themselves. The finished end is sharp enough to open a glove, so break the edges before you handle it.",
    ),
    h2("Where it stops working"),
    p(
      "At a slant you can still do it: stand the offcut on the heel line and lean it back along the branch, at the angle of the joint. But the sighting gets worse as it leans, and below about 60° I would rather find someone with a printer. The depths on the four lines are right at any angle, though. Mark those, join them by eye, cut short of the line, and creep up on it.",
    ),
  ],
  quoted: [
    { text: "8.8 mm", working: "heron-by-hand", result: "deepest" },
    { text: "10.2 mm", working: "heron-by-hand", result: "tipFromAxis" },
    { text: "25.1 mm", sum: () => (Math.PI * 32) / 4 },
    { text: "4.6 mm", working: "heron-by-hand-large", result: "deepest" },
    { text: "2.6 mm", working: "heron-by-hand", result: "insideRelief" },
  ],
};
