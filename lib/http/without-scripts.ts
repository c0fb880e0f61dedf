/** What a page loses: the runtime's scripts and their preloads. Markup, styles and fonts stay. */
const scripts = /<script\b[^>]*>[\s\S]*?<\/script>|<link\b[^>]*\bas="script"[^>]*\/?>/gu;

/** A page of ours without any script but `own`, put at its end with the answer's nonce. */
export function withoutScripts(html: string, own: string, nonce: string): string {
  const bare = html.replace(scripts, '');
  return bare.replace('</body>', `<script nonce="${nonce}">${own}</script></body>`);
}
