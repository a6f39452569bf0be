import { judgeBuild } from '@shared/judging/judge-build';
import { aRun } from './judging';
import type { RunMargin } from '@shared/judging/run-margin';
import type { SeriesInput } from '@shared/judging/build-input';
function mulberry32(a:number){return ()=>{a|=0;a=(a+0x6d2b79f5)|0;let t=Math.imul(a^(a>>>15),1|a);t=(t+Math.imul(t^(t>>>7),61|t))^t;return((t^(t>>>14))>>>0)/4294967296;};}
const rnd=mulberry32(7);const g=()=>Math.sqrt(-2*Math.log(1-rnd()))*Math.cos(2*Math.PI*rnd());
const B=12,S=4;
function sessions(n:number,firstBuild:number,loss:number,repeats=1){ // returns [state][band] runs
  const out:RunMargin[][][]=Array.from({length:S},()=>Array.from({length:B},()=>[]));
  for(let b=0;b<n;b++)for(let r=0;r<repeats;r++)for(let s=0;s<S;s++){const shift=0.5*g();for(let k=0;k<B;k++){out[s][k].push(aRun({buildId:firstBuild+b,run:`${firstBuild+b}-${r}`,marginDb:10+shift+sd[k]*g()-(s===0&&k===0?loss:0)}));}}
  return out;}
let sd=Array(B).fill(0.5);
function once(earlier:number,runs:number,loss:number){
  const h=sessions(earlier,1,0), b=sessions(1,1000,loss,runs);
  const series:SeriesInput[]=[];
  for(let s=0;s<S;s++)series.push({stateId:s,stateName:`${s}`,line:'L',detector:'QP',limitLineKey:'CISPR32_B/QP',bands:h[s].map((hist,k)=>({band:`${k}`,build:b[s][k],reference:hist.slice(-5),previous:hist.slice(-1),history:hist,spread:null,guards:[]}))});
  return judgeBuild({series,thresholdDb:2,targetMarginDb:6});
}
const N=+process.argv[2]||400;
for(const hetero of [false,true]){ sd=hetero?[.2,.2,.3,.3,.4,.5,.5,.6,.8,1,1.2,1.5]:Array(B).fill(.5);
for(const earlier of [1,2,5,20])for(const runs of [1,2,3]){
  let L=0,G=0,held=0,tot=0;const dofs:number[]=[];
  for(let i=0;i<N;i++){const j=once(earlier,runs,0);if(j.some(x=>x.verdict==='lost'))L++;if(j.some(x=>x.verdict==='gained'))G++;held+=j.filter(x=>x.verdict==='held').length;tot+=j.length;dofs.push(j[0].spread!.degreesOfFreedom);}
  dofs.sort((a,b)=>a-b);
  const pow=[2,3,4,6].map(loss=>{let c=0;const M=N/2;for(let i=0;i<M;i++)if(once(earlier,runs,loss)[0].verdict==='lost')c++;return (c/M).toFixed(2);});
  console.log(hetero?'het':'hom','earlier',earlier,'runs',runs,'anyLost',(L/N).toFixed(4),'anyGained',(G/N).toFixed(4),'held',(held/tot).toFixed(2),'dof med',dofs[N>>1].toFixed(1),'power',pow.join(' '));
}}
