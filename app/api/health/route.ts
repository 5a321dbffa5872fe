import { route } from "@/lib/http/route";

export const GET = route({ anybody: true }, () => Promise.resolve({ body: { status: "up" } }));
