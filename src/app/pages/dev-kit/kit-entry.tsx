import { Breadcrumbs } from "#src/components/breadcrumbs.tsx";
import { DateStamp } from "#src/components/date-stamp.tsx";
import { MarginNote } from "#src/components/margin-note.tsx";
import { MarginRow } from "#src/components/margin-row.tsx";
import { NumberTag } from "#src/components/number-tag.tsx";
import { PageHeading } from "#src/components/page-heading.tsx";
import { Photo } from "#src/components/photo.tsx";
import { Plate } from "#src/components/plate.tsx";
import { KitDrawing } from "./kit-drawing.tsx";
import { kitPicture, kitThumbhash } from "./kit-picture.ts";

const written = Date.UTC(2026, 2, 3);

export function KitEntry() {
  return (
    <article>
      <PageHeading
        above={
          <Breadcrumbs
            trail={[
              { label: "Heron", to: "#heron" },
              { label: "Front suspension", to: "#stage" },
            ]}
            here="Entry 4"
          />
        }
        title="Short arm coped at the wrong clock"
        purpose={<DateStamp at={written} now={written + 30 * 86_400_000} />}
      />
      <div className="entry-column prose">
        <p>
          The short arm went on the jig and would not close. The saddle was cut to the right depth and at the
          right angle, but it was turned a quarter of the way round the tube from where it had to be, so the
          heel sat where the toe should. There is no filing that out.
        </p>
        <MarginRow
          notes={
            <>
              <NumberTag to="#w12" label="Working 12: cope">
                W12
              </NumberTag>
              <NumberTag to="#c7" tone="purple" struck label="Choice 7, overturned">
                C7
              </NumberTag>
              <MarginNote tone="purple" shape="turned">
                Overturned in <a href="#e9">entry 9</a>
              </MarginNote>
            </>
          }
        >
          <p>
            What I should have marked first is the hard end: the one with two angles in it. Then the tube is
            turned to suit, and the easy end follows.{" "}
            <strong>Mark the clock line before the saw comes out.</strong>
          </p>
        </MarginRow>
        <h2>What the template said</h2>
        <p>
          The sum was right. I read it off the wrong edge. With a branch of <code>38.1 mm</code> on a header
          of <code>40.0 mm</code> the difference between <a href="#heel">heel and toe</a> is small enough to
          miss by eye.
        </p>
        <MarginRow notes={<NumberTag to="#w12">W12</NumberTag>}>
          <Plate title="Cope of a round branch on a round header" drawing={<KitDrawing />} />
        </MarginRow>
        <ul>
          <li>Scribe the centre line the whole length of the tube.</li>
          <li>Carry the clock across both ends with the tube in the vee block.</li>
        </ul>
        <MarginRow wide notes={<MarginNote>Photo 2</MarginNote>}>
          <Photo
            src={kitPicture}
            alt="A weld bead with bands of heat tint"
            width={1500}
            height={1000}
            thumbhash={kitThumbhash}
            caption="The second pair, tacked. The tint shows where the heat went."
          />
        </MarginRow>
        <blockquote>
          <p>The tray was convenient. That is not a reason.</p>
        </blockquote>
      </div>
    </article>
  );
}
