import { createHash } from 'node:crypto';

/** The drawing office in both lights; the page has no other style, and no script. */
export const style = `
:root{color-scheme:light dark;--ground:#ECEEE8;--paper:#F8F9F5;--well:#E3E7E2;--ink:#15212C;--ink-2:#43515D;--rule:#B3BCBD;--blue:#174A86}
@media (prefers-color-scheme:dark){:root{--ground:#0E1419;--paper:#151D24;--well:#0E1419;--ink:#ECF0EE;--ink-2:#B2BFC7;--rule:#42515D;--blue:#9CC4F5}}
*{box-sizing:border-box}
html{scroll-padding-top:16px}
body{margin:0;padding:14px;background:var(--ground);color:var(--ink);font:400 16px/23px Barlow,system-ui,sans-serif;overflow-wrap:anywhere}
.frame{max-width:1180px;margin:0 auto;background:var(--paper);border:1.5px solid var(--ink)}
header{display:grid;grid-template-columns:1fr auto;border-bottom:1.5px solid var(--ink)}
header>div{padding:12px 16px}header>div+div{border-left:1px solid var(--ink)}
.cap{display:block;font:500 12px/16px "Barlow Semi Condensed",Barlow,system-ui,sans-serif;color:var(--ink-2)}
h1{font:500 30px/36px Barlow,system-ui,sans-serif;margin:0}
h2{font:600 22px/27px Barlow,system-ui,sans-serif;margin:0 0 12px}
h3{font:600 18px/24px Barlow,system-ui,sans-serif;margin:0 0 4px}
h4{font:600 16px/22px Barlow,system-ui,sans-serif;margin:16px 0 4px}
p{margin:0 0 8px;max-width:74ch}
a{color:var(--blue)}
code,pre,.fig{font:400 14px/20px "Roboto Mono",ui-monospace,monospace}
pre{margin:4px 0 0;padding:8px 12px;background:var(--well);border:1px solid var(--rule);white-space:pre-wrap}
section,nav,.about{padding:20px 16px;border-top:1px solid var(--ink)}
.about{border-top:0}
article{padding:16px 0;border-top:1px solid var(--rule)}
article:first-of-type{border-top:0;padding-top:0}
:target{outline:3px solid var(--blue);outline-offset:4px}
nav ul{margin:0;padding:0;list-style:none;columns:18em;column-gap:24px}
nav li{margin:0 0 6px;break-inside:avoid}
nav a{display:inline-block;padding:2px 0;min-height:24px}
.method{font-weight:600;text-transform:uppercase;color:var(--ink)}
.must{font-weight:600}
table{width:100%;border-collapse:collapse;margin:4px 0 0}
th{text-align:left;font:500 12px/16px "Barlow Semi Condensed",Barlow,system-ui,sans-serif;color:var(--ink-2);padding:4px 12px 4px 0;border-bottom:1px solid var(--ink)}
td{vertical-align:top;padding:6px 12px 6px 0;border-bottom:1px solid var(--rule)}
td:first-child{width:30%}
summary{cursor:pointer;min-height:24px;color:var(--blue);margin-top:8px}
@media (max-width:640px){body{padding:0}.frame{border-width:0}header{grid-template-columns:1fr}header>div+div{border-left:0;border-top:1px solid var(--ink)}thead{position:absolute;width:1px;height:1px;overflow:hidden;clip-path:inset(50%)}tr,td{display:block}td,td:first-child{width:auto;padding:2px 0;border:0}tr{padding:6px 0;border-bottom:1px solid var(--rule)}}
`;

const hash = createHash('sha256').update(style).digest('base64');

/** The page's own policy: its style and nothing else. */
export const docsPolicy = [
  "default-src 'none'",
  `style-src 'sha256-${hash}'`,
  "base-uri 'none'",
  "form-action 'none'",
  "frame-ancestors 'none'",
].join('; ');
