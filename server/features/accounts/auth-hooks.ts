import type { BetterAuthOptions } from "better-auth";
import { APIError, createAuthMiddleware, getSessionFromCtx } from "better-auth/api";
import { z } from "zod";
import type { Database } from "#server/db/client.ts";
import { displayName } from "#shared/contracts/people.ts";
import { passwordSetAt } from "./repository.ts";

const addressChange = z.object({ updateTo: z.string(), userId: z.string(), iat: z.number() });

/** Our own rules before better-auth's. */
export function authHooks(database: Database): BetterAuthOptions["hooks"] {
  return {
    before: createAuthMiddleware(async (ctx) => {
      if (ctx.path === "/sign-up/email") {
        const name = displayName.safeParse(ctx.body?.name);
        if (!name.success) throw refusal("INVALID_NAME", name.error.issues[0]?.message);
        return { context: { ...ctx, body: { ...ctx.body, name: name.data } } };
      }
      if (ctx.path === "/change-password") {
        return { context: { ...ctx, body: { ...ctx.body, revokeOtherSessions: true } } };
      }
      if (ctx.path === "/change-email") {
        // A session left open on a shared machine must not be enough to take an account away.
        const session = await getSessionFromCtx(ctx);
        if (!session) return;
        const password = String(ctx.body?.password ?? "");
        const account = await ctx.context.internalAdapter.findCredentialAccount(session.user.id);
        const hash = account?.password;
        const right = hash && (await ctx.context.password.verify({ hash, password }));
        if (!right) throw refusal("INVALID_PASSWORD", "That is not your password.");
      }
      if (ctx.path === "/verify-email" && overtaken(database, ctx.query?.token)) {
        throw ctx.redirect("/verify-email?error=INVALID_TOKEN");
      }
    }),
  };
}

/** A pending change of address ends when the password is set anew: so an owner who was told can stop it. */
function overtaken(database: Database, token: unknown): boolean {
  try {
    // Read only, not trusted: better-auth checks the signature after this.
    const claims = Buffer.from(String(token).split(".")[1] ?? "", "base64url").toString();
    const change = addressChange.safeParse(JSON.parse(claims));
    if (!change.success) return false;
    return change.data.iat < Math.floor(passwordSetAt(database, change.data.userId) / 1000);
  } catch {
    // Not a token at all: better-auth says so.
    return false;
  }
}

function refusal(code: string, message = "Something in this form is not right."): APIError {
  return new APIError("BAD_REQUEST", { code, message });
}
