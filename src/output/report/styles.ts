import { printStyles } from './print-styles.js';

/** The look of the report on screens, wide and narrow, light and dark; then paper. */
export const styles = `
:root{color-scheme:light dark;--paper:#fbfaf6;--ink:#20242c;--quiet:#5c6068;--rule:#c9c4b8;--hair:#e4e0d5;--dusk:#d1792b;--dawn:#2f7f8f;--full:#7a5ea8;--meet:#b3365a;--sun:#c9a400;--link:#235f8f;--night:#262b36;--light:#fbf3da;--serif:ui-serif,"Iowan Old Style","Palatino Linotype",Palatino,Georgia,"Times New Roman",serif;--sans:system-ui,-apple-system,"Segoe UI",Roboto,sans-serif}
@media (prefers-color-scheme:dark){:root{--paper:#14171d;--ink:#e8e4da;--quiet:#a9aaa6;--rule:#3a4049;--hair:#262b33;--dusk:#e08f45;--dawn:#55a9ba;--full:#a68bd8;--meet:#e2708f;--sun:#d9ba2e;--link:#8fc3ee;--night:#0a0c10;--light:#f4ead0}}
*{box-sizing:border-box}
html{font:16px/1.55 var(--sans);font-variant-numeric:tabular-nums lining-nums;background:var(--paper);color:var(--ink);-webkit-text-size-adjust:100%;scroll-padding-top:1rem}
body{margin:0 auto;max-width:46rem;padding:4.5rem 1rem 6rem}
h1,h2,h3,figcaption,.planet,.lead,.date time{font-family:var(--serif)}
h1,h2,h3,figcaption{font-weight:600;line-height:1.2;text-wrap:balance}
h1{font-size:2.75rem;letter-spacing:-.01em;margin:0 0 .8rem}
h2{font-size:1.8rem;margin:5rem 0 1.1rem;padding-top:1.1rem;border-top:2px solid var(--ink)}
h3{font-size:1.2rem;margin:2.6rem 0 .6rem}
p{margin:.7rem 0}
a{color:var(--link);text-underline-offset:.18em;text-decoration-thickness:1px}
a:focus-visible,[tabindex]:focus-visible,summary:focus-visible{outline:3px solid var(--link);outline-offset:3px}
.lead{font-size:1.3rem;line-height:1.45;margin:0}
.note{font-size:.875rem;color:var(--quiet);margin:.5rem 0 0}
.note p{margin:.4rem 0}
.to-numbers{margin:.6rem 0 0}
.skip{position:absolute;left:-999rem}
.skip:focus{position:static}
nav ul{list-style:none;display:flex;flex-wrap:wrap;gap:.3rem 1.3rem;padding:0;margin:1.8rem 0 0}
nav.months ul{font-size:.875rem;gap:.2rem .9rem;margin:1rem 0 0}
.picture{margin:1.2rem 0 2.6rem}
figcaption{font-size:1.3rem;margin-bottom:1rem}
.frame{display:flex}
.gutter{flex:none}
.scroll{overflow-x:auto;overscroll-behavior-x:contain;min-width:0;flex:1}
svg{display:block}
svg text{font:13px var(--sans);fill:var(--ink);font-variant-numeric:tabular-nums}
svg .planet{font:600 15px var(--serif)}
svg .name{font-weight:600}
svg .end{text-anchor:end}
svg .middle{text-anchor:middle}
svg .quiet,svg .axis text{fill:var(--quiet)}
svg .word{stroke:var(--paper);stroke-width:4px;paint-order:stroke;stroke-linejoin:round}
.rule{stroke:var(--hair);stroke-width:1}
.rule.strong{stroke:var(--rule)}
.thread{stroke:var(--rule);stroke-width:1}
.glare{fill:none;stroke:var(--sun);stroke-width:4;stroke-linecap:round;stroke-dasharray:0 7}
.fill-dusk{fill:var(--dusk)}
.fill-dawn{fill:var(--dawn)}
.fill-full{fill:var(--full)}
.mark{fill:var(--ink);stroke:var(--paper);stroke-width:3px;paint-order:stroke;stroke-linejoin:round}
.mark.line{fill:none;stroke:var(--ink);stroke-width:1.6}
.tie path{fill:none;stroke:var(--meet);stroke-width:1.8}
.tie circle{fill:var(--meet);stroke:var(--paper);stroke-width:1.2}
.tie text{fill:var(--meet);font-weight:600}
.key{list-style:none;display:flex;flex-wrap:wrap;gap:.25rem 1.2rem;padding:0;margin:.7rem 0 0}
.key li{display:flex;align-items:center;gap:.4rem}
.scale path,.scale line,.drift path{fill:none;stroke:var(--quiet);stroke-width:1.3}
.stem{stroke:var(--ink);stroke-width:1.4}
.kepler .stem{stroke:var(--dawn)}
.tip{fill:var(--ink)}
.kepler .tip{fill:var(--paper);stroke:var(--dawn);stroke-width:1.8}
.ring{fill:none;stroke:var(--meet);stroke-width:1.6}
.zero{stroke:var(--ink);stroke-width:1}
.range{stroke:var(--dawn);stroke-width:5;stroke-linecap:round;opacity:.55}
.bar{fill:none;stroke:var(--quiet);stroke-width:1.3}
.span{stroke:var(--dawn);stroke-width:2}
.field{fill:var(--night);stroke:var(--rule);stroke-width:1}
.point{fill:var(--light)}
svg .inside{fill:var(--light)}
.lit{fill:var(--light)}
.unlit{fill:var(--night)}
.limb{fill:none;stroke:var(--ink);stroke-width:1}
.closeups figcaption{font-size:1.1rem}
.closeups{display:grid;grid-template-columns:repeat(auto-fill,minmax(20rem,1fr));gap:0 2rem}
.headlines{list-style:none;padding:0;margin:1.6rem 0 0}
.headlines>li{display:grid;grid-template-columns:7.6rem 1fr;gap:0 1.4rem;padding:1.3rem 0;border-top:1px solid var(--rule)}
.headlines h3{margin:0 0 .3rem}
.headlines p{margin:0}
.headlines .note{margin-top:.25rem}
.date time{display:block;font-size:1.2rem;font-weight:600;line-height:1.2}
.date time span{font-weight:400;color:var(--quiet)}
.sky{display:inline-flex;align-items:center;gap:.4rem;font-size:.875rem;color:var(--quiet);margin-top:.3rem}
th .sky{margin:0;display:flex}
.sky::before{content:"";width:.8rem;height:.4rem;background:var(--dusk);border-radius:.4rem .4rem 0 0}
.sky.dawn::before{background:var(--dawn);border-radius:0 0 .4rem .4rem}
.sky.full::before{background:var(--full);height:.8rem;border-radius:50%}
table{border-collapse:collapse;width:100%;font-size:.875rem;line-height:1.45;margin:.4rem 0}
caption{text-align:left;font-weight:600;padding:.4rem 0}
th,td{text-align:left;vertical-align:top;padding:.55rem .9rem .55rem 0;border-bottom:1px solid var(--hair);font-weight:400}
thead th{color:var(--quiet);border-bottom-color:var(--rule)}
.number{text-align:right}
.number:last-child{padding-right:0}
.events{table-layout:fixed}
.events .when{width:9.7rem}
.events .what{width:14rem}
td ul{list-style:none;margin:0;padding:0}
td li+li{margin-top:.15rem}
.place{color:var(--quiet)}
.nowrap{white-space:nowrap}
.caution{border-left:4px solid var(--sun);padding:.1rem 0 .1rem 1.2rem;margin:1.2rem 0}
td.number{white-space:nowrap}
details{margin:.6rem 0 2rem}
.picture+details{margin-top:-1.9rem;margin-bottom:3rem}
summary{cursor:pointer;color:var(--link);font-size:.875rem}
dl{display:grid;grid-template-columns:11rem 1fr;gap:.7rem 1.4rem;font-size:.9375rem}
dt{font-family:var(--serif);font-weight:600}
dd{margin:0}
@media (max-width:44rem){
body{padding-top:2rem}
h1{font-size:2.05rem}
h2{font-size:1.55rem;margin-top:3.6rem}
.lead{font-size:1.15rem}
.headlines>li{grid-template-columns:1fr}
.date{display:flex;gap:.2rem 1rem;flex-wrap:wrap;align-items:baseline}
.closeups{grid-template-columns:1fr}
dl{grid-template-columns:1fr;gap:.2rem}
dd{margin-bottom:.8rem}
.stack,.stack caption,.stack tbody,.stack tr,.stack td,.stack th{display:block}
.stack thead{position:absolute;left:-999rem}
.stack tr{padding:.7rem 0;border-bottom:1px solid var(--rule)}
.stack td,.stack th{border:0;padding:.1rem 0;width:auto}
.stack tbody th{font-weight:600}
.stack tbody th span{font-weight:400}
.stack .number{text-align:left}
.events .when,.events .what{width:auto}
.stack td[data-label]::before{content:attr(data-label) ": ";color:var(--quiet)}
.stack td.bare[data-label]::before{content:none}
}
${printStyles}`;
