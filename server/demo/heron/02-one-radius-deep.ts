import { b, caution, h2, list, p, photo, photos, working } from "../document.ts";
import type { DemoEntry } from "../types.ts";

export const oneRadiusDeep: DemoEntry = {
  slug: "one-radius-deep",
  title: "One radius deep",
  summary:
    "The right-angle joint between equal tubes, then the same joint with a smaller branch, and why the second is the easier one to spoil.",
  stage: "Frame",
  at: "2026-01-11T20:05:00Z",
  state: "public",
  content: [
    p(
      "There are twenty-two right-angle joints in the sides of this frame. In eight of them both tubes are 38 mm. Those are the ones everybody learns on, because there is a rule for them that needs no sum: the recess is exactly one radius deep. For a 38 mm tube that is 19.0 mm, to the middle of the tube, front and back. At the two sides nothing comes off at all.",
    ),
    working("heron-equal", "saddle-cope", "Main upright on the rail", {
      headerOd: 38,
      branchOd: 38,
      branchWall: 2,
      angle: 90,
    }),
    p(
      "The working says the same, which is comforting. It also says something I had never thought about. The tip of the tube reaches the axis of the rail: the distance from the axis is nought. So if the rails are 400 mm apart between centres, the upright is 400 mm long from tip to tip. There is nothing to take off and nothing to remember.",
    ),
    photo(
      "cope-90",
      "Ready to go in. The chalk line runs through the middle of the recess; the two points are a quarter turn away from it.",
    ),
    h2("The points are a nuisance"),
    p(
      "What the rule does not tell you is that equal tubes end in two knife edges. The wall runs out to nothing. Mine were so thin that I could bend them with a thumbnail, and the first one I tacked simply vanished under the arc. I now take about a millimetre off each point with a file. It is not in the drawing. It makes a small gap at each side that the weld fills without trouble, and I would sooner have that than a hole.",
    ),
    h2("A smaller branch is not a smaller radius"),
    p(
      "The lesser uprights are 32 mm on the same 38 mm rail, and there the rule stops. I had half a mind to go 16 mm deep because 16 is the radius of the smaller tube. It is a long way out. The branch only lies on part of the rail's curve, so the cut is 8.8 mm deep.",
    ),
    working("heron-lesser", "saddle-cope", "Lesser upright on the rail", {
      headerOd: 38,
      branchOd: 32,
      branchWall: 1.5,
      angle: 90,
    }),
    p(
      "The other figure that changes is the length. Here the tips stop 10.2 mm short of the rail's axis, at both ends. So the tube is 379.5 mm from tip to tip between the same two rails. I cut the first of them at 400 and could not think why it stood 20 mm proud.",
    ),
    photos(
      photo(
        "template-wrap",
        "The paper goes on with the print outward and the line on the tube under the line on the paper.",
      ),
      photo(
        "weld-close",
        "One of the eight, finished. I was pleased with this one. There are others facing the wall.",
      ),
    ),
    h2("How I cut them"),
    list(
      "Wrap the template, mark round it with a fine marker, and keep the paper.",
      "Hacksaw two straight cuts on the waste side, then a half-round file for the curve.",
      [
        "Try it on an offcut of the rail with chalk on it. File where the chalk comes off. ",
        b("Then"),
        " measure the length.",
      ],
      "Leave an inch spare on the far end until this end fits.",
    ),
    caution(
      "A freshly coped tube is a ring of blades. Gloves for handling, none near a spinning wheel, eyes covered for all of it. Zinc-coated tube gives off fumes that make you ill when it is welded: strip it or leave it alone.",
    ),
    p(
      "Eight down. The fit was within the thickness of a business card on six of them. On the other two I had filed past the line on one side, and those went back a size to be the short uprights by the pedals.",
    ),
  ],
  quoted: [
    { text: "19.0 mm", working: "heron-equal", result: "deepest" },
    { text: "8.8 mm", working: "heron-lesser", result: "deepest" },
    { text: "10.2 mm", working: "heron-lesser", result: "tipFromAxis" },
    { text: "379.5 mm", sum: () => 400 - 2 * Math.sqrt(19 ** 2 - 16 ** 2) },
  ],
};
