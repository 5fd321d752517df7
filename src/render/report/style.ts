/**
 * The look of the report: ink on warm paper, one copper accent, hairlines in place of boxes. Every meaning that has a
 * colour also has a shape, a pattern or a word, so that a page without colour says the same. System fonts only.
 */
export const REPORT_STYLE = `
:root{--ink:#1d2a33;--soft:#5b6770;--hair:#d8d3c7;--paper:#fbf9f4;--copper:#a4501f;--deep:#1f4a5c;--sea:#6f9aa6;--pale:#d3e0e0;--stop:#8d1f1f;--stop-paper:#f8ece7}
*{box-sizing:border-box}
html{-webkit-text-size-adjust:100%;text-size-adjust:100%}
body{margin:0;background:var(--paper);color:var(--ink);font:15px/1.5 system-ui,-apple-system,"Segoe UI",Roboto,"Noto Sans","DejaVu Sans",sans-serif;font-variant-numeric:tabular-nums lining-nums}
main{max-width:62rem;margin:0 auto;padding:2.2rem 1.4rem 3rem}
h1,h2,h3{font-family:"Iowan Old Style","Palatino Linotype",Palatino,"Book Antiqua",Georgia,"DejaVu Serif",serif;font-weight:600;line-height:1.2;margin:0;overflow-wrap:anywhere}
h1{font-size:2.3rem;letter-spacing:-.01em}
h2{font-size:1.4rem}
h3{font-size:.8rem;font-family:inherit;font-weight:600;letter-spacing:.04em;color:var(--soft);margin:0 0 .45rem}
p{margin:.3rem 0}
header p,.purpose{color:var(--soft);font-size:1.02rem;overflow-wrap:anywhere}
.purpose{margin:.1rem 0 0}
section{margin-top:2.4rem}
sub,sup{font-size:.74em;line-height:0}
.tank{border-top:2px solid var(--ink);padding-top:.9rem}
.halves{display:grid;grid-template-columns:minmax(0,1fr) 22.5rem;gap:1.4rem 2.6rem;margin-top:1.1rem}
.halves>div>*+*{margin-top:1.3rem}
table{border-collapse:collapse;width:100%}
caption{text-align:left;font-size:.8rem;font-weight:600;letter-spacing:.04em;color:var(--soft);padding:0 0 .3rem}
th,td{padding:.28rem 0 .28rem 1.1rem;text-align:right;vertical-align:baseline;font-weight:400;border-bottom:1px solid var(--hair);white-space:nowrap}
th:first-child,td:first-child{text-align:left;padding-left:0;white-space:normal;overflow-wrap:anywhere;min-width:6.5rem}
thead th{color:var(--soft);font-size:.86rem}
thead th span{display:block;font-size:.78rem}
.tank>.rows{margin-top:1.4rem}
.glance td:nth-child(2),.glance th:nth-child(2){text-align:left}
.reactions th{color:var(--soft);width:4.6rem;min-width:0;white-space:nowrap}
.reactions td{text-align:left;white-space:normal}
.reactions td.times{text-align:right;color:var(--soft);padding-left:.4rem;white-space:nowrap;min-width:2.4rem}
.reactions td:last-child{padding-left:.6rem}
.reactions tr:last-child td{font-weight:600}
.reactions tr:last-child th,.reactions tr:last-child td{border-bottom:0}
ul{list-style:none;margin:0;padding:0}
.sum{display:flex;flex-wrap:wrap;gap:.9rem 2.2rem;margin:.6rem 0 1.4rem}
.sum li{min-width:5.5rem;font-size:1.1rem}
.sum .what{display:block;font-size:.82rem;color:var(--soft)}
.sum .basis{display:block}
a{color:inherit;text-decoration-color:var(--sea);text-underline-offset:.2em}
.said li{padding:.28rem 0;border-bottom:1px solid var(--hair);overflow-wrap:anywhere}
.said li:last-child{border-bottom:0}
.said b{font-weight:600}
.alarm{color:var(--stop);font-weight:600}
.alarm::before{content:"\\25B2\\00A0";font-size:.72em;vertical-align:.1em}
.grave{background:var(--stop-paper);border:1px solid var(--stop);border-left-width:7px;padding:.9rem 1.2rem 1rem;margin-top:1.5rem}
.grave h2{color:var(--stop);margin-bottom:.35rem}
.grave li{padding:.4rem 0}
.grave li+li{border-top:1px solid #e2c4ba}
.where{font-weight:600}
.basis{color:var(--soft);font-size:.82rem}
.others li{padding:.45rem 0;border-bottom:1px solid var(--hair);font-size:.92rem;break-inside:avoid}
.others ul{columns:2;column-gap:2.6rem}
.fault{border-left:4px solid var(--stop);padding:.1rem 0 .1rem .9rem;margin-top:1rem}
.fault pre{font:13px/1.45 ui-monospace,"DejaVu Sans Mono",Menlo,Consolas,monospace;overflow-x:auto;margin:.2rem 0 0}
figure{margin:0}
figcaption{font-size:.82rem;color:var(--soft);margin-top:.2rem;max-width:22.5rem;overflow-wrap:anywhere}
svg{display:block;max-width:100%;height:auto;overflow:visible}
svg text{font-size:12px;fill:var(--ink)}
svg .axis{fill:var(--soft);font-size:11px}
svg .small{font-size:9px}
svg .axis .small{font-size:8.5px}
svg rect{stroke:var(--ink);stroke-width:1}
svg .part0{fill:var(--deep)}
svg .part1{fill:var(--pale)}
svg .part2{fill:var(--copper)}
svg .part3{fill:var(--sea)}
svg .rest{fill:url(#hatch);stroke-dasharray:none}
svg .rule{stroke:var(--hair)}
svg .base{stroke:var(--soft)}
svg .line{fill:none;stroke:var(--copper);stroke-width:2.4;stroke-linejoin:round}
svg .area{fill:var(--pale)}
svg .envelope{fill:var(--deep);stroke:var(--deep);stroke-width:.9;stroke-linejoin:round}
.hidden{position:absolute;width:0;height:0}
footer{margin-top:2.6rem;border-top:1px solid var(--hair);padding-top:.8rem;color:var(--soft);font-size:.86rem}
@media (max-width:56rem){.halves{grid-template-columns:minmax(0,1fr)}.others ul{columns:1}}
@media (max-width:38rem){
main{padding:1.3rem 1rem 2rem}
h1{font-size:1.9rem}
.grave{padding:.8rem .9rem}
.rows,.rows caption,.rows tbody,.rows tr,.rows td{display:block}
.rows thead{display:none}
.rows tr{display:grid;grid-template-columns:repeat(auto-fill,minmax(6.6rem,1fr));gap:.35rem .9rem;padding:.6rem 0 .65rem;border-bottom:1px solid var(--hair)}
.rows td,.rows td:first-child{padding:0;border:0;text-align:left;white-space:normal;min-width:0}
.rows td:first-child,.rows td:not([data-of]){grid-column:1/-1}
.rows td:first-child{font-weight:600}
.rows td.none{display:none}
.rows td[data-of]::before{content:attr(data-of);display:block;color:var(--soft);font-size:.76rem}
}
@page{size:A4;margin:14mm 14mm 15mm}
@media print{
:root{--paper:#fff;--stop-paper:#fff}
html,body{font-size:11.6px;line-height:1.42}
body{-webkit-print-color-adjust:exact;print-color-adjust:exact}
main{max-width:none;padding:0}
section{margin-top:1.5rem}
.halves{grid-template-columns:minmax(0,1fr) 78mm;gap:.9rem 1.8rem;margin-top:.8rem}
.tank>.rows{margin-top:1rem}
.others ul{columns:2}
.others li{padding:.3rem 0}
.halves,.grave li,.said li,figure,table,.sum{break-inside:avoid}
h2,h3,caption,.purpose{break-after:avoid}
a{text-decoration:none}
}
`.trim();
