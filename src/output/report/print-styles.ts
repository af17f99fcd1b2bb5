/** On paper: A4 or Letter at the pictures' own size, no ground colour, what is folded on the screen left out. */
export const printStyles = `@media print{
@page{margin:16mm 11mm 18mm;@bottom-right{content:counter(page) " of " counter(pages);font:9pt sans-serif}}
:root{color-scheme:light;--paper:#fff;--ink:#000;--quiet:#444;--rule:#aaa;--hair:#ddd;--dusk:#d1792b;--dawn:#2f7f8f;--full:#7a5ea8;--meet:#b3365a;--sun:#c9a400;--link:#000;--night:#fff;--light:#000}
.lit{fill:#fff}
.unlit{fill:#777}
html{background:none;font-size:10.5pt;line-height:1.4}
body{max-width:none;padding:0}
h1{font-size:26pt}
h2{font-size:17pt;margin:22pt 0 8pt}
h2.sheet{break-before:page;margin-top:0}
h3{margin:14pt 0 4pt}
nav,.skip,.to-numbers,details{display:none}
.scroll{overflow:visible}
svg *{-webkit-print-color-adjust:exact;print-color-adjust:exact}
.sky::before{-webkit-print-color-adjust:exact;print-color-adjust:exact}
table{font-size:8.5pt;line-height:1.3}
th,td{padding-top:2.5pt;padding-bottom:2.5pt}
.headlines>li{padding:7pt 0}
.picture,.headlines>li,tr,.caution{break-inside:avoid}
h2,h3,caption,figcaption,thead{break-after:avoid}
thead{display:table-header-group}
.closeups figcaption{font-size:12pt;margin-bottom:4pt}
.closeups .picture{margin:6pt 0}
a{text-decoration:none}
}
`;
