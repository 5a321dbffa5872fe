/** Roles held per area; each includes the rights of the ones before it. */
export const ROLES = ["rigger", "bolter", "steward"] as const;
export type Role = (typeof ROLES)[number];

/** Nobody signed in: sees the public part of the register. */
export interface Visitor {
  kind: "visitor";
}

export interface Person {
  kind: "person";
  userId: string;
  name: string;
  email: string;
  isAdmin: boolean;
  /** Role by area id. An area that is absent is one the person is not a member of. */
  roles: Readonly<Record<string, Role>>;
  /** Set when the request came with an API token: the rights the token carries. Absent: all of the person's. */
  tokenScopes?: readonly TokenScope[];
}

export const TOKEN_SCOPES = ["read", "report", "write"] as const;
export type TokenScope = (typeof TOKEN_SCOPES)[number];

export type Actor = Visitor | Person;

export const VISITOR: Visitor = { kind: "visitor" };
