/** The drawing sheet's colours, light and dark; as the pages of the product have them. */
export const STYLES = `
:root {
  color-scheme: light dark;
  --ground: #f6f3ec; --surface: #ffffff; --ink: #1d2528; --soft: #5a6468; --rule: #cfc8ba; --hair: #e4ded1;
  --glass: #1e6e66; --wash: #f4e9e1; --glaze: #7a3e1d;
}
@media (prefers-color-scheme: dark) {
  :root {
    --ground: #14191b; --surface: #1c2326; --ink: #e7e3da; --soft: #a5aba8; --rule: #3a4448; --hair: #2a3236;
    --glass: #5fb3a8; --wash: #2b221c; --glaze: #d9925f;
  }
}
@font-face { font-family: 'IBM Plex Sans'; src: url('/fonts/IBMPlexSans-Regular.woff'); }
@font-face { font-family: 'IBM Plex Sans'; font-weight: 600; src: url('/fonts/IBMPlexSans-SemiBold.woff'); }
@font-face { font-family: 'IBM Plex Mono'; src: url('/fonts/IBMPlexMono-Regular.woff'); }
* { box-sizing: border-box; }
body { margin: 0; background: var(--ground); color: var(--ink); font: 14px/1.45 'IBM Plex Sans', sans-serif; }
main { max-width: 1040px; margin: 0 auto; padding: 24px 16px 48px; }
header { display: flex; flex-wrap: wrap; gap: 4px 16px; align-items: baseline; margin-bottom: 16px; }
h1 { margin: 0; font-size: 22px; font-weight: 600; line-height: 1.25; overflow-wrap: anywhere; }
h2 { margin: 0; padding: 10px 16px; font-size: 14px; font-weight: 600; border-bottom: 1px solid var(--rule); }
p { margin: 0; }
a { color: var(--glass); text-underline-offset: 2px; }
:focus-visible { outline: 2px solid var(--glass); outline-offset: 2px; }
.soft { color: var(--soft); }
.demo { color: var(--glaze); background: var(--wash); padding: 2px 8px; }
.sheet { background: var(--surface); border: 1px solid var(--rule); margin-bottom: 16px; }
.sheet > p { padding: 16px; }
form { display: flex; flex-wrap: wrap; gap: 8px; align-items: center; margin-bottom: 16px; }
input, button { font: inherit; color: inherit; background: var(--surface); border: 1px solid var(--rule); padding: 6px 10px; }
input { flex: 0 1 280px; min-width: 0; }
button { cursor: pointer; }
ol { list-style: none; margin: 0; padding: 0; }
li + li { border-top: 1px solid var(--hair); }
li a { display: grid; grid-template-columns: 180px minmax(0, 1fr) minmax(0, 1.4fr); gap: 2px 16px; padding: 9px 16px;
  color: inherit; text-decoration: none; overflow-wrap: anywhere; }
li a:hover { background: var(--wash); }
li strong { font-weight: 600; color: var(--glass); }
time { font-family: 'IBM Plex Mono', monospace; font-size: 13px; color: var(--soft); }
dl { display: grid; grid-template-columns: max-content minmax(0, 1fr); gap: 4px 16px; margin: 0; padding: 12px 16px; }
dt { color: var(--soft); }
dd { margin: 0; overflow-wrap: anywhere; }
pre { margin: 0; padding: 16px; font: 13px/1.5 'IBM Plex Mono', monospace; white-space: pre-wrap; overflow-wrap: anywhere; }
iframe { display: block; width: 100%; height: 560px; border: 0; background: #f6f3ec; }
@media (max-width: 640px) {
  li a { grid-template-columns: minmax(0, 1fr); }
  iframe { height: 640px; }
}
`;
