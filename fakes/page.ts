import { FONT_FACES } from './fonts';

/**
 * The frame of the stand-ins' own pages: workshop paper and ink, no outside files, so they look right offline.
 *
 * They are marked as local on every page, because somebody will one day mistake them for the real thing.
 */
export function page({
  title,
  heading,
  body,
  wide = false,
}: {
  title: string;
  heading: string;
  body: string;
  wide?: boolean;
}): string {
  return `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>${escapeHtml(title)}</title>
<style>${STYLE}</style>
</head>
<body>
<header><a href="/" class="home">${escapeHtml(heading)}</a><span class="local">local stand-in, nothing leaves this machine</span></header>
<main${wide ? ' class="wide"' : ''}>
${body}
</main>
</body>
</html>`;
}

export function escapeHtml(text: string): string {
  return text.replace(/[&<>"']/g, (sign) => ENTITIES[sign] ?? sign);
}

const ENTITIES: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

const STYLE = `${FONT_FACES}
:root{--paper:#FAF8F3;--bench:#EFEBE1;--rule:#D8D2C4;--line:#7D7768;--ink:#1E2326;--quiet:#565C60;--faint:#6B675C;--halo:#D9B44A;--proved:#26527B;--held:#8E2F20;--field:#FFFFFF}
@media (prefers-color-scheme:dark){:root{--paper:#181A1B;--bench:#212425;--rule:#3A3D3C;--line:#8A867A;--ink:#ECE6D8;--quiet:#B5B1A4;--faint:#A9A595;--proved:#8DB9E0;--held:#EE8B7D;--field:#101213}}
*{box-sizing:border-box}
body{margin:0;background:var(--paper);color:var(--ink);font:400 14.5px/20px Barlow,"Segoe UI",system-ui,sans-serif}
header{display:flex;align-items:center;justify-content:space-between;gap:16px;flex-wrap:wrap;min-height:48px;padding:8px 24px;border-bottom:1.5px solid var(--ink)}
.home{color:var(--ink);text-decoration:none}
.home,h1,h2,label,button,nav a[aria-current]{font-family:"Barlow Semi Condensed",Barlow,sans-serif;font-weight:600}
.home{font-size:18px}
.local,.caption,th{color:var(--faint);font-size:13px;font-weight:400}
main{max-width:1016px;margin:0 auto;padding:24px}
main.wide{max-width:1440px}
h1{font-size:26px;line-height:32px;margin:0 0 4px}
h2{font-size:18px;line-height:24px;margin:36px 0 8px;padding-top:8px;border-top:1.5px solid var(--ink)}
p{margin:8px 0;max-width:70ch}
a{color:var(--ink);text-underline-offset:2px}
:focus-visible{outline:2px solid var(--ink);outline-offset:2px;box-shadow:0 0 0 4px var(--halo)}
table{width:100%;border-collapse:collapse}
th{text-align:left;white-space:nowrap;padding:6px 12px 6px 0;border-bottom:1px solid var(--ink)}
td{padding:8px 12px 8px 0;border-bottom:1px solid var(--rule);vertical-align:top;overflow-wrap:anywhere}
tbody tr:hover td{background:var(--bench)}
code,.mono{font-family:"Spline Sans Mono",ui-monospace,Menlo,Consolas,monospace;font-size:13px;font-variant-numeric:tabular-nums}
dl{display:grid;grid-template-columns:max-content 1fr;gap:4px 16px;margin:12px 0}
dt{color:var(--faint);font-size:13px}dd{margin:0;overflow-wrap:anywhere}
.ok{color:var(--proved);font-weight:600}.bad{color:var(--held);font-weight:600}.quiet{color:var(--quiet)}.right{text-align:right}.keep{white-space:nowrap}@media (max-width:640px){.keep{white-space:normal}}
nav{display:flex;gap:24px;margin:16px 0 12px;border-bottom:1px solid var(--rule)}
nav a{padding:6px 0;text-decoration:none}nav a[aria-current]{font-weight:600;border-bottom:4px solid var(--ink)}
form.inline{display:inline}form.row{display:flex;gap:12px;align-items:end;flex-wrap:wrap;margin:12px 0}
form.stack{display:grid;gap:16px;max-width:420px;margin:24px 0}
label{display:grid;gap:4px;font-size:14.5px;font-weight:600}
input,select{font:400 14.5px/20px Barlow,"Segoe UI",system-ui,sans-serif;color:var(--ink);background:var(--field);border:1px solid var(--line);border-radius:0;padding:7px 8px;min-height:36px}
button{font:inherit;font-weight:600;color:var(--ink);background:transparent;border:1px solid var(--line);border-radius:0;padding:6px 12px;cursor:pointer}
button.primary{background:var(--ink);color:var(--paper);border-color:var(--ink);padding:10px 20px;clip-path:polygon(9px 0,100% 0,100% 100%,9px 100%,0 calc(100% - 9px),0 9px)}
button.small{padding:3px 8px;font-family:inherit;font-weight:400;font-size:13.5px}
pre{background:var(--bench);padding:16px;overflow:auto;white-space:pre-wrap;overflow-wrap:anywhere;margin:0;font:13px/19px "Spline Sans Mono",ui-monospace,Menlo,Consolas,monospace}
iframe{width:100%;height:70vh;min-height:420px;border:1px solid var(--rule);background:#FFFFFF}
.empty{padding:36px 0;color:var(--quiet)}
@media (max-width:640px){main{padding:16px}header{padding:8px 16px}.narrow-off{display:none}}
`;
