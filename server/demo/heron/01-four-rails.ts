import { b, entryLink, h2, list, p, photo, table } from "../document.ts";
import { kilogramsPerMetre } from "../sums.ts";
import type { DemoEntry } from "../types.ts";

const rails = () => 20 * kilogramsPerMetre(38, 2);
const diagonals = () => 18 * kilogramsPerMetre(32, 1.5);
const crossTubes = () => 6 * kilogramsPerMetre(25, 1.5);

export const fourRails: DemoEntry = {
  slug: "four-rails-on-the-shed-floor",
  title: "Four rails on the shed floor",
  summary:
    "What Heron is meant to be, the three sizes of tube I am allowing myself, and why the drawing is on the concrete.",
  stage: "Frame",
  at: "2025-12-07T18:20:00Z",
  state: "public",
  content: [
    p(
      "Heron is a car for one person and one short hill. It has a tube frame, two wishbones at each front corner and an engine that is still in somebody else's shed. I have wanted to make one since I was about eleven. I am now old enough to know how much of it I will make twice.",
    ),
    p("This first entry has no cutting in it. It is here so that I can be held to what I said at the start."),
    photo("shed-door", "Low Barn on the morning it was swept. It has not looked like this since."),
    h2("Three sizes of tube, no more"),
    p(
      "My last frame used seven sizes. I spent a winter looking for the right offcut. Heron gets three, all cold-drawn round tube from the same merchant, and if a fourth seems needed I will change the drawing instead.",
    ),
    table(
      ["Tube", "Where", "Length", "Weight"],
      ["38 × 2 mm", "Four rails, main uprights, both hoops", "20 m", "35.5 kg"],
      ["32 × 1.5 mm", "Diagonals, lesser uprights", "18 m", "20.3 kg"],
      ["25 × 1.5 mm", "Cross tubes", "6 m", "5.2 kg"],
    ),
    p(
      "That makes 61.0 kg of steel before a single bracket. The lengths are off the drawing and the weights are plain arithmetic: the area of the ring times the length times 7.85 grams for each cubic centimetre. A metre of the big tube is 1.78 kg. I will weigh the bare frame when it is done and print both figures here, whichever way it goes.",
    ),
    h2("Why the drawing is on the floor"),
    p(
      "I drew the side of the car full size on the concrete, with a chalk line and a stick of soapstone. The rails lie ",
      b("400 mm"),
      " apart between centre lines, top to bottom, and the bays are 280 mm long where the driver's legs go. A drawing you can stand on tells you things that paper does not. I found out where my knees go. I also found out that the floor falls 9 mm over the length of the car, so heights will come from a stretched wire and never from the concrete.",
    ),
    p(
      "Every joint is drawn as two centre lines that cross. The tubes only have thickness when I cut them. That sounds obvious, but most of my old mistakes came from measuring to the edge of something.",
    ),
    h2("What I am promising"),
    list(
      "Every number that metal is cut from gets written here, with the sum it came from.",
      "When a number was wrong, the old one stays on the page and the new one goes beside it.",
      "I say how I measured, with what, and how often.",
      "I am not an engineer. I make things and I ask people. Nothing here is an approval of anything.",
    ),
    p(
      "Next comes the dullest joint on the car and the one there are most of: ",
      entryLink("two equal tubes at a right angle", "heron", "one-radius-deep"),
      ". If I cannot get that one right there is no point in the rest.",
    ),
  ],
  quoted: [
    { text: "35.5 kg", sum: rails },
    { text: "20.3 kg", sum: diagonals },
    { text: "5.2 kg", sum: crossTubes },
    { text: "61.0 kg", sum: () => rails() + diagonals() + crossTubes() },
    { text: "1.78 kg", sum: () => kilogramsPerMetre(38, 2) },
  ],
};
