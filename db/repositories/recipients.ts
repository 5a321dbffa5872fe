import "server-only";
import { sql } from "drizzle-orm";
import type { Handle } from "@/db/client";

export interface Recipient {
  userId: string;
  email: string;
}

/**
 * Who is written to about an anchor: the stewards of its area, and those who follow the anchor or its site as
 * far as they may still see it. Somebody who left the area hears nothing more of what is shown to members only.
 */
export async function listRecipients(db: Handle, anchorId: string): Promise<Recipient[]> {
  const rows = await db.execute<{ user_id: string; email: string }>(sql`
    with about as (
      select a.id as anchor_id, s.id as site_id, s.area_id,
        s.visibility = 'members' or r.visibility = 'members' as members_only
      from anchors a join sites s on s.id = a.site_id join areas r on r.id = s.area_id
      where a.id = ${anchorId})
    select u.id as user_id, u.email from users u, about
    left join lateral (
      select m.role from memberships m where m.user_id = u.id and m.area_id = about.area_id) m on true
    where u.disabled_at is null and (
      m.role = 'steward'
      or (
        exists (select 1 from watches w where w.user_id = u.id
          and (w.anchor_id = about.anchor_id or w.site_id = about.site_id))
        and (m.role is not null or u.is_admin or not about.members_only)))
    order by u.id`);
  return rows.map((row) => ({ userId: row.user_id, email: row.email }));
}

/** The stewards of an area. */
export async function listStewards(db: Handle, areaId: string): Promise<Recipient[]> {
  const rows = await db.execute<{ user_id: string; email: string }>(sql`
    select u.id as user_id, u.email from users u
    join memberships m on m.user_id = u.id and m.area_id = ${areaId} and m.role = 'steward'
    where u.disabled_at is null order by u.id`);
  return rows.map((row) => ({ userId: row.user_id, email: row.email }));
}
