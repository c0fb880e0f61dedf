const address = /(https?:\/\/[^\s<>"')\]]+)/u;

/** What a person wrote: plain text, of which only http and https addresses become links. */
export function PlainText({ children }: { readonly children: string }) {
  return (
    <span className="wrap-anywhere whitespace-pre-wrap">
      {children.split(address).map((piece, index) => (index % 2 === 1
        ? <a key={index} href={piece} rel="noopener nofollow" target="_blank" className="text-act underline underline-offset-2">{piece}</a>
        : piece))}
    </span>
  );
}
