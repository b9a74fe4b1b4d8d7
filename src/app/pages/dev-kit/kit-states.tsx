import { Avatar } from "#src/components/avatar.tsx";
import { Button } from "#src/components/button.tsx";
import { DataTable } from "#src/components/data-table.tsx";
import { Disclosure } from "#src/components/disclosure.tsx";
import { EmptyState } from "#src/components/empty-state.tsx";
import { ErrorState } from "#src/components/error-state.tsx";
import { LoadingState } from "#src/components/loading-state.tsx";
import { MeaningTag } from "#src/components/meaning-tag.tsx";
import { Notice } from "#src/components/notice.tsx";
import { NumberTag } from "#src/components/number-tag.tsx";
import { OlderLink } from "#src/components/older-link.tsx";
import { Progress } from "#src/components/progress.tsx";

const pieces = [
  { mark: "H14", name: "Lower wishbone, front leg", od: "25.4", length: "312.5" },
  { mark: "H15", name: "Lower wishbone, rear leg", od: "25.4", length: "1,041.0" },
  { mark: "H16", name: "Rack mount, left", od: "19.0", length: "86.0" },
];

export function KitStates() {
  return (
    <div className="flex flex-col gap-8">
      <div className="flex flex-wrap items-center gap-3">
        <NumberTag>W12</NumberTag>
        <NumberTag to="#c7" tone="temper">
          C7
        </NumberTag>
        <NumberTag tone="purple" struck>
          C3
        </NumberTag>
        <MeaningTag tone="temper" shape="post">
          Standing
        </MeaningTag>
        <MeaningTag tone="straw" shape="half">
          In doubt
        </MeaningTag>
        <MeaningTag tone="purple" shape="turned">
          Overturned
        </MeaningTag>
        <MeaningTag tone="bronze" shape="file">
          Draft
        </MeaningTag>
        <MeaningTag tone="grey" shape="dot">
          Held
        </MeaningTag>
        <Avatar name="Maren Holt" />
        <Avatar name="Idris Pell" size="small" />
      </div>
      <div className="grid gap-3 lg:grid-cols-2">
        <Notice>Lise Brandt posted a counter-working under W12.</Notice>
        <Notice kind="attention">Two pieces were cut to the old length.</Notice>
        <Notice kind="error" actions={<Button>Try again</Button>}>
          The photo did not arrive. Nothing else was lost.
        </Notice>
        <Notice kind="success">Entry 9 is published.</Notice>
      </div>
      <DataTable
        caption="Cut list"
        columns={[
          { key: "mark", head: "Piece", rowHead: true, cell: (row) => <NumberTag>{row.mark}</NumberTag> },
          { key: "name", head: "For", cell: (row) => row.name },
          { key: "od", head: "Outside", unit: "mm", numeric: true, cell: (row) => row.od },
          { key: "length", head: "Length", unit: "mm", numeric: true, cell: (row) => row.length },
        ]}
        rows={pieces}
        rowKey={(row) => row.mark}
      />
      <OlderLink to="#older">Older pieces</OlderLink>
      <Progress label="Making the archive" value={0.42} onCancel={() => undefined} />
      <Progress label="Reading the photo" detail="frame-side.jpg" />
      <div className="grid gap-8 lg:grid-cols-2">
        <EmptyState title="No measurements yet" action={<Button tone="primary">Add a measurement</Button>}>
          Start with one that other numbers hang from: a ride height, a track, a wheelbase.
        </EmptyState>
        <ErrorState title="The page did not load" reference="k3f-91c" action={<Button>Load it again</Button>}>
          The server did not answer in time. What you typed is still here.
        </ErrorState>
        <LoadingState label="Loading the entry" plate />
        <Disclosure summary="Method and source">
          The branch is unrolled at its outside; heel and toe follow from the angle.
        </Disclosure>
      </div>
    </div>
  );
}
