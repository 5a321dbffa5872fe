import type { PhotoView } from "@/lib/schemas/views/anchor";

/** Small pictures that open the large copy. */
export function PhotoStrip({ photos, about }: { photos: readonly PhotoView[]; about: string }) {
  if (photos.length === 0) return null;
  return (
    <ul className="flex flex-wrap gap-2 pt-1">
      {photos.map((photo, index) => (
        <li key={photo.id}>
          <a href={photo.largeUrl} className="block border border-line-strong hover:border-action">
            {/* A copy of a fixed small size from our own store: nothing left to optimise. */}
            <PlainImage photo={photo} alt={photo.caption || `Photo ${index + 1}: ${about}`} />
          </a>
        </li>
      ))}
    </ul>
  );
}

function PlainImage({ photo, alt }: { photo: PhotoView; alt: string }) {
  const Image = "img";
  return (
    <Image src={photo.thumbUrl} alt={alt} loading="lazy" className="h-28 w-auto" width={160} height={112} />
  );
}
