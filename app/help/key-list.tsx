import { KeyCap } from '../_ui/key-cap';
import { keyTables } from './help-keys';

/** The keys, place by place. */
export function KeyList() {
  return keyTables.map(({ place, lines }) => (
    <div key={place} className="pt-2">
      <h3 className="font-[660]">{place}</h3>
      <dl>
        {lines.map(({ keys, does }) => (
          <div key={does} className="line-row flex flex-wrap gap-x-4 gap-y-1 py-1.5">
            <dt className="flex w-44 shrink-0 flex-wrap gap-1">
              {keys.map((key) => (
                <KeyCap key={key}>{key}</KeyCap>
              ))}
            </dt>
            <dd className="min-w-0 flex-1 basis-48 text-ink2">{does}</dd>
          </div>
        ))}
      </dl>
    </div>
  ));
}
