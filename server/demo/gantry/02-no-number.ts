import { caution, entryLink, h2, list, p, photo, quote, steps, table } from "../document.ts";
import type { DemoEntry } from "../types.ts";

/** Second moment of area of an IPE 100 about its strong axis, mm⁴: 171 cm⁴ in EN 10365 (from memory). */
const secondMoment = 1.71e6;

/** Sag in the middle of a beam on two supports under a load in the middle: F L³ / 48 E I, mm. */
const sag = (kilograms: number) => (kilograms * 9.81 * 2200 ** 3) / (48 * 210_000 * secondMoment);

export const noNumber: DemoEntry = {
  slug: "why-there-is-no-number-on-the-beam",
  title: "Why there is no number on the beam",
  summary:
    "Several people want me to paint a load on the gantry. I have measured what it does, and I still will not.",
  stage: "Beam and hoist",
  at: "2026-11-01T17:10:00Z",
  state: "public",
  content: [
    p(
      "The gantry is up. It rolls, it stands square, and the hoist runs from end to end without being pushed. Since then I have had the same question eleven times: what does it lift? Two people have offered me a figure. They were not the same figure, and they were not polite to each other about it.",
    ),
    photo("gantry", "Done, apart from the paint on the legs. The beam was yellow when I got it."),
    quote(
      "The chain hoist has its capacity on the plate, so that is what the gantry lifts. Paint that on and be done with it.",
    ),
    p(
      "The plate on the hoist is about the hoist. It has no idea what I have hung it from. What a gantry can take is set by its weakest part, and there are a good many parts: the beam in bending, the beam twisting sideways, the trolley on its flange, the bolts through the head plates, the legs being pushed, the welds at the top, four castors on a concrete floor with a crack in it.",
    ),
    h2("What I did instead"),
    p(
      "I cannot rate it. I can find out whether it does what a sum says, with a small load, close to the ground. The beam is an old IPE 100 with 2200 mm between the heads. A section table gives its second moment of area as 171 cm⁴. A load in the middle should make it sag by the load times the span cubed, over 48 E I.",
    ),
    table(
      ["Load in the middle", "Sag by the sum", "Sag measured"],
      ["50 kg", "0.30 mm", "0.3 mm"],
      ["100 kg", "0.61 mm", "0.7 mm"],
      ["150 kg", "0.91 mm", "1.0 mm"],
    ),
    steps(
      "Sacks of sand, weighed on bathroom scales, in a sling from the hook.",
      "Hook 100 mm off the floor, with timber under the load, so that there was nowhere to fall to.",
      "A dial gauge under the middle of the beam, standing on its own post and not on the gantry.",
      "Each load put on and taken off three times. It came back to nought each time, within 0.05 mm.",
    ),
    p(
      "So the beam bends as a beam of that sort should, and a little more, which I put down to the heads settling. That is worth knowing. It says that the beam is what I think it is. It says nothing about the welds at a larger load, or a load that swings, or one that is pulled sideways, or what the castors do when one of them finds the crack.",
    ),
    h2("Why not a cautious number"),
    list(
      "A number on a beam outlives the person who knows what it meant.",
      "People read it as a promise. I am not able to make that promise.",
      "Half of a guess is still a guess.",
    ),
    p(
      "What I have done is to ask a lifting inspector to look at it, drawings and all. Until she has, what hangs from it is what I am content to see fall on the floor. If she wants it cut up, I will cut it up, and there will be an entry with a picture. The ",
      entryLink("braces", "shed-gantry", "an-angle-that-is-not-the-angle"),
      " at least are a good fit.",
    ),
    caution(
      "Home-made lifting gear has killed people who were sure of it. Keep from under the load, always. Where anyone else works, there are rules about examination and marking: find out what they are where you live, and have it examined by somebody competent.",
    ),
    p(
      "About the comments: a disagreement is welcome here and so is a sum. Joan has held a few that had neither. If yours was one, she has written to you and told you why.",
    ),
  ],
  quoted: [
    { text: "0.30 mm", sum: () => sag(50) },
    { text: "0.61 mm", sum: () => sag(100) },
    { text: "0.91 mm", sum: () => sag(150) },
  ],
};
