import "server-only";
import { versionTag } from "@/lib/http/request";
import type { RouteAnswer } from "@/lib/http/route";

/** 201 with where it is, if it has an address of its own; 200 with the same body when the same was sent before. */
export function createdAnswer<T extends { id: string; replayed: boolean }>(
  collection: string | null,
  { replayed, ...body }: T,
): RouteAnswer {
  return {
    status: replayed ? 200 : 201,
    body,
    headers: collection ? { location: `${collection}/${body.id}` } : {},
  };
}

/** 200 with the new version, also as the ETag the next write wants. */
export function changedAnswer(body: { id: string; version: number }): RouteAnswer {
  return { body, headers: { etag: versionTag(body.version) } };
}
