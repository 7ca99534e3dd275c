import { basisExample } from '@/lib/desk/plan';

const percent = (value: number): string =>
  `${value < 0 ? '−' : '+'}${Math.abs(value).toFixed(2)} %`;

/** Why the basis matters, on a tool near its limit. The numbers are computed. */
export function BasisExplained() {
  const tolerance = 4;
  const { setTo, delivers, deviations, inside } = basisExample(tolerance);
  const verdict = (isInside: boolean) => (isInside ? 'inside the limit' : 'beyond the limit');
  return (
    <div className="flex flex-col gap-3">
      <p>
        A wrench is set to {setTo} N·m and lets go at {delivers} N·m. Its maker claims ±{tolerance}{' '}
        %.
      </p>
      <dl className="flex flex-col gap-3">
        <div>
          <dt className="font-semibold">Relative to what the tester measured</dt>
          <dd>
            <span className="font-reading whitespace-nowrap">
              ({setTo} − {delivers}) / {delivers} = {percent(deviations.reference)}
            </span>
            <br />
            {verdict(inside.reference)}
          </dd>
        </div>
        <div>
          <dt className="font-semibold">Relative to what the tool says</dt>
          <dd>
            <span className="font-reading whitespace-nowrap">
              ({delivers} − {setTo}) / {setTo} = {percent(deviations.set)}
            </span>
            <br />
            {verdict(inside.set)}
          </dd>
        </div>
      </dl>
      <p className="text-fore-quiet">
        The same pull, two answers. The standard divides by what was measured; some makers’ claims
        are meant the other way. Every record says which was used. Far from a limit both agree.
      </p>
    </div>
  );
}
