'use client';

import { useQuery } from '@tanstack/react-query';
import { useState, type FormEvent } from 'react';
import { parseTagCode } from '@/lib/line/code';
import { Button } from '../ui/button';
import { Loading } from '../ui/loading';
import { TextInput } from '../ui/text-input';
import { useBench } from './bench-context';
import { BenchPanel } from './bench-panel';
import { fetchTag } from './fetch-tag';
import { FoundTagActions } from './found-tag-actions';
import { ToolLine } from './tool-line';

/** Any tag of the meet by its code: to call it, hang its tool, check it again or hand it back. */
export function FindPanel({ onClose }: { onClose: () => void }) {
  const { bench } = useBench();
  const [typed, setTyped] = useState('');
  const [code, setCode] = useState<string | null>(null);
  const [error, setError] = useState<string>();
  const found = useQuery({
    queryKey: ['bench-tag', bench.bench.id, code],
    queryFn: () => fetchTag(bench.bench.id, code ?? ''),
    enabled: code !== null,
    networkMode: 'always',
    retry: false,
    staleTime: 0,
    gcTime: 0,
  });
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const parsed = parseTagCode(typed);
    setError(parsed ? undefined : 'A code is a letter and two digits, such as A27.');
    setCode(parsed);
    if (parsed && parsed === code) void found.refetch();
  };
  return (
    <BenchPanel title="Find a tag" onClose={onClose}>
      <form onSubmit={submit} className="flex items-end gap-3">
        <TextInput
          label="Code"
          value={typed}
          autoFocus
          autoComplete="off"
          autoCapitalize="characters"
          spellCheck={false}
          maxLength={10}
          error={error ?? (found.error ? found.error.message : undefined)}
          onChange={(event) => setTyped(event.target.value)}
          className="font-code min-h-16 text-4xl font-bold uppercase"
          fieldClassName="w-56"
        />
        <Button type="submit" size="big">
          Find
        </Button>
      </form>
      {found.isFetching && <Loading label="Looking" lines={2} />}
      {found.data && !found.isFetching && (
        <div className="flex flex-col gap-4" aria-live="polite">
          <ToolLine tag={found.data} size="small" still />
          <FoundTagActions
            key={found.data.id + found.data.state + found.data.place}
            tag={found.data}
            onChanged={() => void found.refetch()}
            onClose={onClose}
          />
        </div>
      )}
    </BenchPanel>
  );
}
