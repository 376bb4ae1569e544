import { cookieOf, deviceCookieName, expiredCookie, readCookie, sessionCookieName } from "@/lib/auth/cookies";
import { json, noContent } from "@/lib/http/answer";
import { clientAddress } from "@/lib/http/origin";
import { openRoute, route } from "@/lib/http/route";
import { showMe } from "@/lib/services/me/show";
import { closeSession } from "@/lib/services/session/close";
import { DEVICE_SECONDS, openSession } from "@/lib/services/session/open";

export const POST = openRoute("session.open", { body: true }, async ({ ctx, body, request }) => {
  const cookies = request.headers.get("cookie");
  const { actor, token, seconds, device } = await openSession({
    ctx,
    input: body,
    from: {
      address: clientAddress(request),
      userAgent: request.headers.get("user-agent") ?? "",
      oldToken: readCookie(cookies, sessionCookieName()),
      device: readCookie(cookies, deviceCookieName()),
    },
  });
  const me = await showMe({ ctx: { ...ctx, actor } });
  return json(me, {
    status: 201,
    headers: {
      "set-cookie": [
        cookieOf(sessionCookieName(), token, seconds),
        cookieOf(deviceCookieName(), device, DEVICE_SECONDS),
      ],
    },
  });
});

export const GET = route("session.show", {}, async ({ ctx }) => {
  const me = await showMe({ ctx });
  return json(me, { version: me.version });
});

export const DELETE = openRoute("session.close", {}, async ({ ctx, request }) => {
  await closeSession({ ctx, token: readCookie(request.headers.get("cookie"), sessionCookieName()) });
  return noContent({
    headers: { "set-cookie": expiredCookie(sessionCookieName()), "clear-site-data": '"cache"' },
  });
});
