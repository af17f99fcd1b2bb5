/** The whole look of the report: one style sheet, light and dark, screen, phone and paper. */
export const styles = `
:root{color-scheme:light dark;--paper:#fbfaf6;--ink:#20242c;--quiet:#5c6068;--rule:#c9c4b8;--dusk:#d1792b;--dawn:#2f7f8f;--full:#7a5ea8;--meet:#b3365a;--sun:#c9a400;--link:#235f8f;--band:#f1eee4}
@media (prefers-color-scheme:dark){:root{--paper:#14171d;--ink:#e8e4da;--quiet:#a9aaa6;--rule:#3a4049;--dusk:#e29450;--dawn:#5ab0c1;--full:#a58ad6;--meet:#e2708f;--sun:#d9ba2e;--link:#8fc3ee;--band:#1d2129}}
*{box-sizing:border-box}
html{font:16px/1.55 system-ui,-apple-system,"Segoe UI",sans-serif;font-variant-numeric:tabular-nums lining-nums;background:var(--paper);color:var(--ink);-webkit-text-size-adjust:100%}
body{margin:0 auto;max-width:44rem;padding:2.5rem 1rem 5rem;box-sizing:content-box}
h1,h2,h3,figcaption{font-family:ui-serif,Georgia,"Times New Roman",serif;font-weight:600;line-height:1.2;text-wrap:balance}
h1{font-size:2.3rem;margin:0 0 .4rem}
h2{font-size:1.55rem;margin:3.6rem 0 .8rem;padding-top:.8rem;border-top:1px solid var(--rule)}
h3{font-size:1.15rem;margin:2rem 0 .5rem}
p{margin:.6rem 0}
a{color:var(--link);text-underline-offset:.15em}
a:focus-visible,[tabindex]:focus-visible,summary:focus-visible{outline:3px solid var(--link);outline-offset:3px}
.lead{font-size:1.15rem;color:var(--quiet);margin:0}
.note{font-size:.875rem;color:var(--quiet);margin:.4rem 0 0}
.skip{position:absolute;left:-999rem}
.skip:focus{position:static}
nav ul{list-style:none;display:flex;flex-wrap:wrap;gap:.2rem 1.2rem;padding:0;margin:1.2rem 0 0}
.picture{margin:1.4rem 0 1.8rem}
figcaption{font-size:1.2rem;margin-bottom:.5rem}
.scroll{overflow-x:auto;overscroll-behavior-x:contain}
svg{display:block;overflow:visible}
svg text{font:13px system-ui,-apple-system,"Segoe UI",sans-serif;fill:var(--ink);font-variant-numeric:tabular-nums}
svg .name{font-weight:600}
svg .end{text-anchor:end}
svg .middle{text-anchor:middle}
svg .quiet,.axis text{fill:var(--quiet)}
.rule{stroke:var(--rule);stroke-width:1;stroke-dasharray:1 4}
.rule.strong{stroke-dasharray:none}
.ribbon.dusk,.fill-dusk{fill:var(--dusk)}
.ribbon.dawn,.fill-dawn{fill:var(--dawn)}
.ribbon.dusk{fill:url(#hatch-dusk)}
.ribbon.dawn{fill:url(#hatch-dawn)}
.ribbon.full{fill:var(--full)}
.ribbon.sun{fill:var(--sun)}
.fill-paper{fill:var(--paper)}
.mark{fill:var(--ink);stroke:none}
.mark.line{fill:none;stroke:var(--ink);stroke-width:1.6}
.tie path{fill:none;stroke:var(--meet);stroke-width:1.6}
.tie circle{fill:var(--meet)}
.swatch{display:inline-block;vertical-align:-.1em}
.stem{stroke:var(--ink);stroke-width:1.2}
.stems circle{fill:var(--ink)}
.stems.kepler .stem{stroke:var(--dawn)}
.stems.kepler circle{fill:var(--dawn)}
.stems circle.ring{fill:none;stroke:var(--meet);stroke-width:1.5}
.zero{stroke:var(--ink);stroke-width:1}
.field{fill:none;stroke:var(--rule);stroke-width:1.5}
.disc{fill:var(--ink)}
.drift path,.scale line{fill:none;stroke:var(--quiet);stroke-width:1.4}
.closeups{display:grid;grid-template-columns:repeat(auto-fill,minmax(18.8rem,1fr));gap:0 1.5rem}
.headlines{list-style:none;padding:0;margin:0}
.headlines li{display:grid;grid-template-columns:7.2rem 1fr;gap:0 1rem;padding:.8rem 0;border-bottom:1px solid var(--rule)}
.headlines time{color:var(--quiet);white-space:nowrap}
.headlines p{margin:0}
table{border-collapse:collapse;width:100%;font-size:.875rem;line-height:1.4}
caption{text-align:left;font-weight:600;padding:.4rem 0}
th,td{text-align:left;vertical-align:top;padding:.4rem .7rem .4rem 0;border-bottom:1px solid var(--rule)}
thead th{color:var(--quiet);font-weight:600}
td.when{white-space:nowrap;width:9.5rem}
td.what{width:15rem}
td.number,th.number{text-align:right}
td ul{list-style:none;margin:0;padding:0}
td li+li{margin-top:.25rem}
.place{color:var(--quiet)}
.caution{border-left:4px solid var(--sun);padding:.2rem 0 .2rem 1rem;margin:1rem 0}
details{margin:.6rem 0}
summary{cursor:pointer;color:var(--link)}
dl{display:grid;grid-template-columns:minmax(7rem,auto) 1fr;gap:.3rem 1.2rem}
dt{font-weight:600}
dd{margin:0}
@media (max-width:40rem){
body{padding-top:1.5rem}
h1{font-size:1.8rem}
.headlines li{grid-template-columns:1fr}
dl{grid-template-columns:1fr}
dd{margin-bottom:.5rem}
table.stack,table.stack tbody,table.stack tr,table.stack td,table.stack th{display:block}
table.stack thead{position:absolute;left:-999rem}
table.stack tr{padding:.6rem 0;border-bottom:1px solid var(--rule)}
table.stack caption{display:block}
table.stack td,table.stack th{border:0;padding:.1rem 0}
table.stack td.number{text-align:left}
td.when,td.what{width:auto}
table.stack td[data-label]::before{content:attr(data-label) ": ";color:var(--quiet)}
}
@media print{
@page{margin:18mm 15mm}
:root{--paper:#fff;--ink:#000;--quiet:#444;--rule:#bbb;--dusk:#d1792b;--dawn:#2f7f8f;--full:#7a5ea8;--meet:#b3365a;--sun:#c9a400;--link:#000}
html{background:none;font-size:10.5pt}
body{max-width:none;padding:0}
nav,.skip,.note a{display:none}
.scroll{overflow:visible}
.picture svg{max-width:100%;height:auto}
table{font-size:8.5pt}
.picture,.headlines li,tr{break-inside:avoid}
h2,h3,caption{break-after:avoid}
h2.sheet{break-before:page}
details>*{display:block}
thead{display:table-header-group}
a{text-decoration:none}
}
`;
