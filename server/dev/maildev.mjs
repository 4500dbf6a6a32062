// The demo's mailbox: catches every mail the shop sends and shows it on a page.
import { MailDev } from "maildev";

const [smtpPort, webPort, mailDirectory] = process.argv.slice(2);

const mailbox = new MailDev({
  smtp: Number(smtpPort),
  ip: "127.0.0.1",
  web: Number(webPort),
  webIp: "127.0.0.1",
  silent: true,
  mailDirectory,
  maxEmails: 500,
});
process.once("SIGTERM", () => process.exit(0));
await mailbox.start();
