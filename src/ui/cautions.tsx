import { CAUTIONS } from '#shared/kernel/sheet/cautions.ts';

/** Stands beside every place that offers files to cut by. */
export function Cautions() {
  return (
    <div className="border-l-4 border-caution py-1 pl-3">
      <p className="font-bold text-caution">Caution: before you cut</p>
      <ul className="list-disc pl-4 text-12">
        {CAUTIONS.map((caution) => (
          <li key={caution}>{caution}</li>
        ))}
      </ul>
    </div>
  );
}
