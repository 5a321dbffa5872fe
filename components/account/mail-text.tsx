/** A plain text mail with its links to press. */
export function MailText({ body }: { body: string }) {
  return (
    <div className="type-code leading-relaxed break-words whitespace-pre-wrap">
      {body.split(/(https?:\/\/[^\s<>"]+)/).map((part, index) =>
        index % 2 === 1 ? (
          <a key={index} href={part} className="break-all text-link">
            {part}
          </a>
        ) : (
          part
        ),
      )}
    </div>
  );
}
