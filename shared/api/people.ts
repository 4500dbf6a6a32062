import { z } from "zod";
import { limits } from "../limits.ts";
import { type Contract, idInput, instant, noInput, okDto, required, text } from "./contract.ts";

export const roles = ["shopper", "stall", "grower", "owner"] as const;
export type Role = (typeof roles)[number];

export const ifMissingChoices = ["similar", "credit", "money_back"] as const;
export const ifMissing = z.enum(ifMissingChoices);
export type IfMissing = z.infer<typeof ifMissing>;

export const emailText = z
  .string()
  .trim()
  .toLowerCase()
  .max(limits.emailMax, "That address is too long.")
  .pipe(z.email("That does not look like an e-mail address."));

/** Where to go after signing in: a path of this shop, nothing else. */
export const nextPath = z
  .string()
  .max(300)
  .regex(/^\/(?![/\\])[^\s\\]*$/)
  .catch("/");

export const PersonDto = z.object({
  id: z.uuid(),
  email: z.string(),
  name: z.string(),
  phone: z.string(),
  role: z.enum(roles),
  ifMissing,
  can: z.object({ office: z.boolean(), crew: z.boolean(), stall: z.boolean() }),
});
export type PersonDto = z.infer<typeof PersonDto>;

export const MeDto = z.object({
  person: PersonDto.nullable(),
  csrfToken: z.string(),
  demo: z
    .object({ now: instant, people: z.array(z.object({ id: z.uuid(), name: z.string(), role: z.enum(roles) })) })
    .nullable(),
});
export type MeDto = z.infer<typeof MeDto>;

export const getMe = {
  method: "GET",
  path: "/api/me",
  summary: "Who is signed in here",
  input: noInput,
  output: MeDto,
  isPublic: true,
} as const satisfies Contract;

export const updateMe = {
  method: "PATCH",
  path: "/api/me",
  summary: "Change my name, phone and what to do when something is missing",
  input: z.object({ name: text(limits.nameMax), phone: text(limits.phoneMax), ifMissing }),
  output: PersonDto,
} as const satisfies Contract;

export const askSignIn = {
  method: "POST",
  path: "/api/sign-in",
  summary: "Send a sign-in link and code",
  isPublic: true,
  input: z.object({ email: emailText, next: nextPath.default("/") }),
  output: okDto,
} as const satisfies Contract;

const SignedInDto = z.object({ person: PersonDto, csrfToken: z.string(), next: z.string() });

export const signInByLink = {
  method: "POST",
  path: "/api/sign-in/link",
  summary: "Sign in with the token of a link",
  isPublic: true,
  input: z.object({ token: z.string().min(1).max(2_000) }),
  output: SignedInDto,
} as const satisfies Contract;

export const signInByCode = {
  method: "POST",
  path: "/api/sign-in/code",
  summary: "Sign in with the six digits, where sign-in began",
  isPublic: true,
  input: z.object({
    code: z
      .string()
      .trim()
      .transform((v) => v.replaceAll(" ", ""))
      .pipe(z.string().regex(/^\d{6}$/, "The code has six digits.")),
  }),
  output: SignedInDto,
} as const satisfies Contract;

export const signOut = {
  method: "POST",
  path: "/api/sign-out",
  summary: "End this session",
  input: noInput,
  output: okDto,
} as const satisfies Contract;

export const SessionDto = z.object({
  id: z.string(),
  device: z.string(),
  startedAt: instant,
  expiresAt: instant,
  isThisOne: z.boolean(),
});
export type SessionDto = z.infer<typeof SessionDto>;

export const listSessions = {
  method: "GET",
  path: "/api/me/sessions",
  summary: "Where I am signed in",
  input: noInput,
  output: z.array(SessionDto),
} as const satisfies Contract;

export const endSession = {
  method: "DELETE",
  path: "/api/me/sessions/:id",
  summary: "Sign out one device",
  input: z.object({ id: z.string().regex(/^[0-9a-f]{64}$/) }),
  output: okDto,
} as const satisfies Contract;

export const endOtherSessions = {
  method: "POST",
  path: "/api/me/sessions/end-others",
  summary: "Sign out everywhere else",
  input: noInput,
  output: okDto,
} as const satisfies Contract;

export const StaffDto = z.object({
  id: z.uuid(),
  email: z.string(),
  name: z.string(),
  role: z.enum(roles),
  invitedAt: instant.nullable(),
  firstSeenAt: instant.nullable(),
  can: z.object({ change: z.boolean() }),
});
export type StaffDto = z.infer<typeof StaffDto>;

const staffRole = z.enum(["stall", "grower", "owner"]);

export const listStaff = {
  method: "GET",
  path: "/api/office/staff",
  summary: "Everyone who works here",
  input: noInput,
  output: z.array(StaffDto),
} as const satisfies Contract;

export const inviteStaff = {
  method: "POST",
  path: "/api/office/staff",
  summary: "Invite someone to work here",
  makes: true,
  input: z.object({ email: emailText, name: required(limits.nameMax), role: staffRole }),
  output: StaffDto,
} as const satisfies Contract;

export const changeRole = {
  method: "PATCH",
  path: "/api/office/staff/:id",
  summary: "Change someone's role; shopper means no longer staff",
  input: idInput.extend({ role: z.enum(roles) }),
  output: StaffDto,
} as const satisfies Contract;

export const moveDemoClock = {
  method: "POST",
  path: "/api/demo/clock",
  summary: "Demo only: jump ahead to the next deadline or market morning, or by minutes",
  isPublic: true,
  input: z.object({ to: z.enum(["next_close", "next_market", "hour"]) }),
  output: z.object({ now: instant }),
} as const satisfies Contract;

export const switchDemoPerson = {
  method: "POST",
  path: "/api/demo/person",
  summary: "Demo only: become one of the demo people",
  isPublic: true,
  input: idInput,
  output: SignedInDto,
} as const satisfies Contract;
