import { useQuery } from "@tanstack/react-query";
import type { SessionLine } from "#shared/contracts/sessions.ts";
import { Button } from "#src/components/button.tsx";
import { DateStamp } from "#src/components/date-stamp.tsx";
import { ErrorState } from "#src/components/error-state.tsx";
import { LoadingState } from "#src/components/loading-state.tsx";
import { MeaningTag } from "#src/components/meaning-tag.tsx";
import { toasts } from "#src/components/toast-store.ts";
import { useApi } from "#src/lib/api.ts";
import { messageOf } from "#src/lib/form-errors.ts";
import { useHydrated } from "#src/lib/use-hydrated.ts";
import { sessionsQuery, useEndOtherSessions, useEndSession } from "../queries.ts";

const tell = {
  onError: (error: Error) => toasts.show({ kind: "error", message: messageOf(error) }),
};

/** Every device a person is signed in on, with a button to end each. */
export function SessionList() {
  const hydrated = useHydrated();
  const { data: sessions, dataUpdatedAt: now, error, refetch } = useQuery(sessionsQuery(useApi()));
  const endOthers = useEndOtherSessions();
  if (error) {
    return (
      <ErrorState
        title="The list did not come"
        action={<Button onClick={() => void refetch()}>Try again</Button>}
      >
        {messageOf(error)}
      </ErrorState>
    );
  }
  if (!sessions) return <LoadingState label="Loading where you are signed in" lines={3} />;
  const hasOthers = sessions.some((session) => !session.isThisDevice);
  return (
    <>
      <ul className="border-hairline border-t">
        {sessions.map((session) => (
          <SessionItem key={session.id} session={session} now={now} />
        ))}
      </ul>
      {hasOthers ? (
        <div>
          <Button
            disabled={!hydrated}
            busy={endOthers.isPending}
            busyLabel="Signing out…"
            onClick={() =>
              endOthers.mutate(undefined, {
                ...tell,
                onSuccess: () =>
                  toasts.show({ kind: "success", message: "Every other device is signed out." }),
              })
            }
          >
            Sign out all other devices
          </Button>
        </div>
      ) : (
        <p className="text-ink-soft text-sm">You are signed in nowhere else.</p>
      )}
    </>
  );
}

function SessionItem({ session, now }: { session: SessionLine; now: number }) {
  const hydrated = useHydrated();
  const end = useEndSession();
  const { id, device, address, since, isThisDevice } = session;
  return (
    <li className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2 border-hairline border-b py-3">
      <div className="min-w-0 flex-1 basis-60">
        <p className="flex flex-wrap items-center gap-x-3 gap-y-1 font-semibold">
          {device}
          {isThisDevice ? (
            <MeaningTag tone="temper" shape="target">
              This device
            </MeaningTag>
          ) : null}
        </p>
        <p className="mt-1 text-ink-soft text-xs">
          {address ? (
            <>
              From <span className="figures wrap-anywhere">{address}</span>, since{" "}
            </>
          ) : (
            "Since "
          )}
          <DateStamp at={since} now={now} withTime />
        </p>
      </div>
      {isThisDevice ? null : (
        <Button
          disabled={!hydrated}
          busy={end.isPending}
          busyLabel="Signing out…"
          onClick={() => end.mutate(id, tell)}
        >
          Sign out<span className="sr-only"> {device}</span>
        </Button>
      )}
    </li>
  );
}
