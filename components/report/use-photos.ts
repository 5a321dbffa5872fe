"use client";

import { useCallback, useState } from "react";
import { v7 } from "uuid";
import type { PickedPhoto } from "@/components/report/photo-picker";
import { sendPhoto } from "@/components/report/photo-upload";

/** Chosen photos and their sending, one after the other: a phone's uplink gains nothing from two at once. */
export function usePhotos() {
  const [photos, setPhotos] = useState<readonly PickedPhoto[]>([]);
  const change = useCallback((id: string, to: Partial<PickedPhoto>) => {
    setPhotos((all) => all.map((photo) => (photo.id === id ? { ...photo, ...to } : photo)));
  }, []);

  const add = useCallback((files: readonly File[]) => {
    setPhotos((all) => [
      ...all,
      ...files.map((file): PickedPhoto => ({ id: v7(), file, state: "waiting", part: 0, problem: null })),
    ]);
  }, []);

  const remove = useCallback((id: string) => setPhotos((all) => all.filter((photo) => photo.id !== id)), []);

  const send = useCallback(
    async (photo: PickedPhoto, url: string): Promise<boolean> => {
      change(photo.id, { state: "sending", part: 0, problem: null });
      const problem = await sendPhoto({ url, id: photo.id, file: photo.file }, (part) =>
        change(photo.id, { part }),
      );
      change(photo.id, problem === null ? { state: "sent", part: 1 } : { state: "refused", problem });
      return problem === null;
    },
    [change],
  );

  /** Sends what has not been sent. @returns whether all of it was taken. */
  const sendAll = useCallback(
    async (url: string): Promise<boolean> => {
      let all = true;
      for (const photo of photos.filter((one) => one.state !== "sent")) {
        all = (await send(photo, url)) && all;
      }
      return all;
    },
    [photos, send],
  );

  return { photos, add, remove, send, sendAll };
}
