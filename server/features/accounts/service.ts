import type { Database } from "#server/db/client.ts";
import { AppError } from "#server/http/errors.ts";
import type { Person, Viewer } from "#server/http/viewer.ts";
import type { Me, PersonPage, PersonSummary, UpdateProfileBody } from "#shared/contracts/people.ts";
import type { PhotoView } from "#shared/contracts/photos.ts";
import type { SessionLine } from "#shared/contracts/sessions.ts";
import { deviceName } from "./device-name.ts";
import {
  deleteSession,
  deleteSessionsBut,
  findUser,
  findUserByHandle,
  findUsers,
  hasBuild,
  listSessions,
  ownsPortrait,
  type UserRow,
  updateUser,
} from "./repository.ts";

interface AccountParts {
  database: Database;
  clock: () => number;
  photoViews: (ids: Iterable<string>) => Map<string, PhotoView>;
}

export type AccountService = ReturnType<typeof createAccountService>;

/** People and their profiles. Passwords, addresses and sign-in are better-auth's (`auth.ts`). */
export function createAccountService({ database, clock, photoViews }: AccountParts) {
  /** How many people look to others, by id, in one query. */
  function summaries(ids: Iterable<string>): Map<string, PersonSummary> {
    const wanted = [...new Set(ids)];
    if (wanted.length === 0) return new Map();
    const rows = findUsers(database, wanted);
    const views = photoViews(rows.flatMap((row) => row.avatarPhotoId ?? []));
    return new Map(rows.map((row) => [row.id, summary(row, views)]));
  }

  function summary(row: UserRow, views: Map<string, PhotoView>): PersonSummary {
    const avatar = row.avatarPhotoId ? views.get(row.avatarPhotoId) : undefined;
    return { handle: row.handle, name: row.name, avatar: avatar ?? null };
  }

  function summaryOf(row: UserRow): PersonSummary {
    return summary(row, photoViews(row.avatarPhotoId ? [row.avatarPhotoId] : []));
  }

  function me(viewer: Viewer): Me | null {
    const row = viewer && findUser(database, viewer.id);
    if (!row) return null;
    const { id, email, emailVerified, bio, units, role } = row;
    const isBuilder = hasBuild(database, id);
    return { ...summaryOf(row), id, email, emailVerified, bio, units, role, isBuilder };
  }

  function updateProfile(viewer: Person, change: UpdateProfileBody): Me {
    database.transaction((tx) => {
      const { avatarPhotoId } = change;
      if (avatarPhotoId && !ownsPortrait(tx, viewer.id, avatarPhotoId)) {
        const fields = { avatarPhotoId: "Upload the picture first." };
        throw new AppError("invalid_input", "There is no such picture of yours.", { fields });
      }
      updateUser(tx, viewer.id, { ...change, updatedAt: new Date(clock()) });
    });
    const changed = me(viewer);
    if (!changed) throw new AppError("not_signed_in", "Sign in to do this.");
    return changed;
  }

  function person(handle: string): PersonPage {
    const row = findUserByHandle(database, handle);
    if (!row) throw new AppError("not_found", "There is nobody here by that name.");
    return { ...summaryOf(row), bio: row.bio, since: row.createdAt.getTime() };
  }

  function ownSessions(viewer: Person, presentId: string | undefined): SessionLine[] {
    return listSessions(database, viewer.id, clock()).map((session) => ({
      id: session.id,
      device: deviceName(session.userAgent),
      address: session.ipAddress || null,
      since: session.createdAt.getTime(),
      lastUsed: session.updatedAt.getTime(),
      isThisDevice: session.id === presentId,
    }));
  }

  function endSession(viewer: Person, id: string): void {
    if (!deleteSession(database, viewer.id, id)) {
      throw new AppError("not_found", "That session has ended already.");
    }
  }

  function endOtherSessions(viewer: Person, presentId: string | undefined): void {
    if (!presentId) throw new AppError("not_signed_in", "Sign in to do this.");
    deleteSessionsBut(database, viewer.id, presentId);
  }

  return { summaries, me, updateProfile, person, ownSessions, endSession, endOtherSessions };
}
