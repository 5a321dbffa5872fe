import { addPhoto } from "@/lib/commands/add-photo";
import { MAX_PHOTO_BYTES } from "@/lib/domain/report/photo-limits";
import { commandContext } from "@/lib/commands/context";
import { createdAnswer } from "@/lib/http/created";
import { parseOrRefuse } from "@/lib/http/parse";
import { readUpload } from "@/lib/http/request";
import { route } from "@/lib/http/route";
import { idParam } from "@/lib/schemas/query";
import { photoFields } from "@/lib/schemas/photo";

export const POST = route(
  { params: idParam, signedIn: true, limit: "photo-person" },
  async ({ params, request, ...from }) => {
    const { fields, file } = await readUpload(request, MAX_PHOTO_BYTES);
    const { id, caption } = parseOrRefuse(photoFields, fields);
    const photo = { id, caption, bytes: file ?? new Uint8Array(), to: { boltId: params.id } };
    return createdAnswer(null, await addPhoto(commandContext(from), photo));
  },
);
