import "server-only";
import NextAuth, { CredentialsSignin, type AuthError } from "next-auth";
import Credentials from "next-auth/providers/credentials";
import { LinkOpened, SignIn } from "@/lib/core/contract/account";
import { checkPassword } from "./check-password";
import { clientAddress } from "./client-address";
import { deviceName } from "./device-name";
import { takeToken } from "./one-time-token";
import { SESSION_SECONDS, sessionIdOf, siteIsSecure } from "./session-cookie";
import { endSessionById, openSession, sessionLives } from "./sessions";

/** Too many tries: `code` says from when it works again. Told the same for addresses nobody has. */
class TooManyTries extends CredentialsSignin {
  constructor(until: Date) {
    super();
    this.code = `wait-until-${until.toISOString()}`;
  }
}

/** The moment in a refused sign-in, where there were too many tries. */
export const waitUntil = (code: string | undefined): string | undefined => /^wait-until-(.+)$/.exec(code ?? "")?.[1];

/** A browser holds one session: the one it had before, whoever's it was, ends with the new one. */
async function signedIn(userId: string, headers: Headers) {
  const before = await sessionIdOf(headers);
  const sid = await openSession(userId, deviceName(headers));
  if (before) await endSessionById(before);
  return { id: userId, sid };
}

const nextAuth = NextAuth({
  session: { strategy: "jwt", maxAge: SESSION_SECONDS }, // the credentials provider works with no other
  trustHost: true, // or every request is refused outside `next dev`
  useSecureCookies: siteIsSecure(),
  pages: { signIn: "/sign-in", error: "/sign-in", signOut: "/account" },
  logger: {
    // A wrong password or a forged form is no error of the server. (By type, not by name: names are minified.)
    error: (error) => (["CredentialsSignin", "MissingCSRF"].includes((error as AuthError).type) ? undefined : console.error(error)),
  },
  providers: [
    Credentials({
      id: "password",
      credentials: { email: {}, password: {} },
      async authorize(input, request) {
        const parsed = SignIn.safeParse(input);
        if (!parsed.success) return null;
        const checked = await checkPassword(parsed.data.email, parsed.data.password, clientAddress(request.headers));
        if (checked.result === "wait") throw new TooManyTries(checked.until);
        return checked.result === "right" ? signedIn(checked.userId, request.headers) : null;
      },
    }),
    // A link from a mail. Not Auth.js' own mail provider: that signs in on GET, and mail scanners open links.
    Credentials({
      id: "link",
      credentials: { token: {} },
      async authorize(input, request) {
        const parsed = LinkOpened.safeParse(input);
        const link = parsed.success ? await takeToken("sign-in", parsed.data.token) : null;
        return link?.userId ? signedIn(link.userId, request.headers) : null;
      },
    }),
  ],
  callbacks: {
    async jwt({ token, user }) {
      if (user && "sid" in user) return { sub: user.id, sid: user.sid };
      // Every later use of the token: it holds while its row is there. null ends the session.
      return typeof token.sid === "string" && (await sessionLives(token.sid)) ? token : null;
    },
    session({ session, token }) {
      // Roles are per fleet and read anew on each request: they are never in the cookie.
      return { expires: session.expires, user: { ...session.user, id: token.sub ?? "" } };
    },
  },
  events: {
    // A request under way when one signs out may set the old cookie again: without its row it is worth nothing.
    async signOut(message) {
      if ("token" in message && typeof message.token?.sid === "string") await endSessionById(message.token.sid);
    },
  },
});

export const { handlers, signIn, signOut } = nextAuth;
