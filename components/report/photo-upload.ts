/** Sends one photo and tells how far it is. Resolves to null, or to the words of the refusal. */
export function sendPhoto(
  { url, id, file }: { url: string; id: string; file: File },
  onProgress: (part: number) => void,
): Promise<string | null> {
  return new Promise((resolve) => {
    const body = new FormData();
    body.set("id", id);
    body.set("file", file);
    const request = new XMLHttpRequest();
    request.open("POST", url);
    request.responseType = "text";
    request.upload.onprogress = (event) => {
      if (event.lengthComputable) onProgress(event.loaded / event.total);
    };
    request.onerror = () => resolve("No connection. The photo is still here; try again.");
    request.onload = () => resolve(request.status < 300 ? null : refusalOf(request.responseText));
    request.send(body);
  });
}

/** The server's own sentence, from its problem document. */
function refusalOf(text: string): string {
  try {
    const problem: unknown = JSON.parse(text);
    if (
      typeof problem === "object" &&
      problem !== null &&
      "detail" in problem &&
      typeof problem.detail === "string"
    ) {
      const errors = "errors" in problem && Array.isArray(problem.errors) ? problem.errors : [];
      const [first]: unknown[] = errors;
      if (
        typeof first === "object" &&
        first !== null &&
        "message" in first &&
        typeof first.message === "string"
      ) {
        return first.message;
      }
      return problem.detail;
    }
  } catch {
    // the answer was no problem document
  }
  return "The photo was not taken, and the answer did not say why. Try again.";
}
