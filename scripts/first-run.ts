// Prints the link that makes the administrator of a new installation; nothing when there is one already.
// Run: node --conditions=react-server --import tsx scripts/first-run.ts
import { connect } from "@/db/client";
import { issueFirstRunLink } from "@/lib/auth/first-run";
import { now } from "@/lib/config/clock";
import { env } from "@/lib/config/env";

const { db, close } = connect(env().DATABASE_URL, 1);
try {
  const link = await issueFirstRunLink(db, now());
  if (link) process.stdout.write(`${link}\n`);
} finally {
  await close();
}
