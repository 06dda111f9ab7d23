import { buildDrawing } from '#shared/kernel/drawing/build-drawing.ts';
import { nameLayers } from '#shared/kernel/profiles/name-layers.ts';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { dado, workedExample } from '../builders/worked-example.ts';
const opening = (label: string): any => ({ opening: { label } });
const column = (name: string): any => ({ rows: [opening(`${name}1`), opening(`${name}2`), opening(`${name}3`)], between: 1.5 });
const f=(width:number)=>workedExample({outline:{kind:'members',width,height:40,stiles:{left:1.75,right:1.75},rails:{top:1.75,bottom:1.25},feet:0,layout:{columns:['A','B','C','D'].map(column),between:1.5}},
 dados:[0.25, 16, 32, 48, 70].map((at, i) => dado({ part: `Part ${i}`, at, to: 40 }))});
const { profile } = BUILTIN_PROFILES[0]!;
const med=(g:()=>unknown)=>{const t=[];for(let i=0;i<900;i++){const a=performance.now();g();if(i>400)t.push((performance.now()-a)*1000);}t.sort((a,b)=>a-b);return [t[10],t[250]]};
let w=72; const worked=workFrame(f(72));
console.log('work',med(()=>workFrame(f(w+=1/64))));
console.log('names',med(()=>nameLayers(worked,profile)));
console.log('back',med(()=>buildDrawing(worked,'back',profile)));
console.log('front',med(()=>buildDrawing(worked,'front',profile)));
