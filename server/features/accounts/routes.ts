import { type Route, route } from "#server/http/endpoints.ts";
import { signedIn } from "#server/http/policy.ts";
import { getMe, getPerson, updateProfile } from "#shared/contracts/people.ts";
import {
  type DemoSignIn,
  endOtherSessions,
  endSession,
  listDemoSignIns,
  listSessions,
} from "#shared/contracts/sessions.ts";
import type { AccountService } from "./service.ts";

/** @param demoSignIns the demo's people; nobody when the demo is not loaded */
export function accountRoutes(accounts: AccountService, demoSignIns: () => DemoSignIn[]): Route[] {
  return [
    route(getMe, (_request, { viewer }) => ({ me: accounts.me(viewer) })),
    route(updateProfile, ({ body }, { viewer }) => accounts.updateProfile(signedIn(viewer), body)),
    route(getPerson, ({ params }) => accounts.person(params.handle)),
    route(listSessions, (_request, { viewer, http }) => ({
      sessions: accounts.ownSessions(signedIn(viewer), http?.sessionId),
    })),
    route(endSession, ({ params }, { viewer }) => {
      accounts.endSession(signedIn(viewer), params.session);
      return { done: true as const };
    }),
    route(endOtherSessions, (_request, { viewer, http }) => {
      accounts.endOtherSessions(signedIn(viewer), http?.sessionId);
      return { sessions: accounts.ownSessions(signedIn(viewer), http?.sessionId) };
    }),
    route(listDemoSignIns, () => ({ signIns: demoSignIns() })),
  ];
}
