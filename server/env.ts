import { z } from "zod";

const flag = z
  .enum(["0", "1"])
  .default("0")
  .transform((v) => v === "1");
const blank = (schema: z.ZodType<string>) => z.preprocess((v) => (v === "" ? undefined : v), schema.optional());

const schema = z
  .object({
    NODE_ENV: z.enum(["production", "development", "test"]).default("production"),
    PORT: z.coerce.number().int().min(0).max(65_535).default(3000),
    HOST: z.string().default("127.0.0.1"),
    ORIGIN: z.url({ protocol: /^https?$/ }),
    DATABASE_URL: z.url({ protocol: /^postgres(ql)?$/ }),
    DATABASE_POOL_MAX: z.coerce.number().int().min(2).max(100).default(10),
    SESSION_SECRET: z.string().min(32, "needs at least 32 characters; make one with: openssl rand -base64 48"),
    SMTP_URL: z.url({ protocol: /^smtps?$/ }),
    MAIL_FROM: z.email(),
    CLOCK: z.enum(["real", "demo"]).default("real"),
    DEMO: flag,
    TILE_URL: blank(z.url()),
    TILE_ATTRIBUTION: blank(z.string().min(1)),
    TRUST_PROXY: z.coerce.number().int().min(0).max(10).default(0),
    LOG_LEVEL: z.enum(["silent", "fatal", "error", "warn", "info", "debug"]).default("info"),
  })
  .superRefine((env, ctx) => {
    const say = (path: string, message: string) => ctx.addIssue({ code: "custom", path: [path], message });
    if (env.TILE_URL && !env.TILE_ATTRIBUTION) say("TILE_ATTRIBUTION", "is needed with TILE_URL");
    if (env.DEMO && env.CLOCK !== "demo") say("CLOCK", "must be demo when DEMO=1");
    if (env.CLOCK === "demo" && env.NODE_ENV === "production" && !env.DEMO) say("CLOCK", "demo needs DEMO=1");
    const local = ["127.0.0.1", "localhost", "[::1]"].includes(new URL(env.ORIGIN).hostname);
    if (env.NODE_ENV === "production" && !local && !env.ORIGIN.startsWith("https:"))
      say("ORIGIN", "must begin with https:// unless it is this machine itself");
    if (env.DEMO && !local) say("DEMO", "lets anyone sign in as anyone, so it runs only on this machine itself");
  });

export type Env = z.output<typeof schema> & { isHttps: boolean };

/** Reads every setting once. Throws one sentence that lists each wrong or missing variable by name. */
export function readEnv(source: Record<string, string | undefined> = process.env): Env {
  const parsed = schema.safeParse(source);
  if (parsed.success) return { ...parsed.data, isHttps: parsed.data.ORIGIN.startsWith("https:") };
  const lines = parsed.error.issues.map((issue) => `  ${issue.path.join(".")}: ${issue.message}`);
  throw new Error(`These settings need attention (each is explained in .env.example):\n${lines.join("\n")}`);
}
