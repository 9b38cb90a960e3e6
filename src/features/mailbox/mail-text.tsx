import { Link } from 'react-router';

const address = /(https?:\/\/\S+)/;

/** A message's plain text; addresses of our own site become links, others stay text. */
export function MailText({ text }: { text: string }) {
  return (
    <div className="[overflow-wrap:anywhere] whitespace-pre-wrap">
      {text.split(address).map((piece, index) => {
        // A message does not change: the place of a piece is who it is.
        const key = `${String(index)} ${piece}`;
        const url = address.test(piece) && URL.canParse(piece) ? new URL(piece) : null;
        // The demonstration may be reached by another name than the one it writes into its messages.
        const ours =
          url !== null &&
          !url.pathname.startsWith('//') &&
          ['localhost', '127.0.0.1', window.location.hostname].includes(url.hostname);
        if (!ours) return <span key={key}>{piece}</span>;
        return (
          <Link key={key} to={`${url.pathname}${url.search}`}>
            {piece}
          </Link>
        );
      })}
    </div>
  );
}
