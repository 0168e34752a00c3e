'use client';

import { useMutation } from '@tanstack/react-query';
import { type ReactNode, useState } from 'react';
import { callApi } from '@/app/_api';
import { Caution } from '@/app/_ui/caution';
import { useAnnounce } from '@/app/_ui/live-region';
import { TitleBlock } from '@/app/_ui/title-block';
import { Verdict } from '@/app/_ui/verdict';
import type { Sizing, SizingInput, SizingSheet } from '@/modules/sizing';
import { Answer } from './answer';
import { SizingEditor } from './sizing-editor';
import { standingFigures } from './standing-figures';

interface Props {
  readonly sheet: SizingSheet;
  /** For people with several teams. */
  readonly teamChoice: ReactNode;
}

/** The sizing sheet: the table of patterns to ask with, and the answer to what was asked last. */
export function SizingSheetView({ sheet, teamChoice }: Props) {
  const { team, skills, kinds, beginning } = sheet;
  const [latest, setLatest] = useState<Sizing | null>(sheet.latest);
  const announce = useAnnounce();
  const sizing = useMutation({
    mutationFn: (input: SizingInput) => callApi<Sizing>('POST', `teams/${team.id}/sizings`, input),
    onSuccess: (answered) => {
      setLatest(answered);
      announce('Sized. The answer stands below the table.');
    },
  });
  return (
    <>
      <Verdict actions={teamChoice} lead={<Lead teamName={team.name} />}>
        Sizing
      </Verdict>
      <SizingEditor
        kinds={kinds}
        skills={skills}
        currency={team.currency}
        start={latest?.input ?? beginning}
        beginning={beginning}
        onSize={sizing.mutateAsync}
        onStartAgain={sizing.reset}
        problem={sizing.error}
      />
      {latest ? <Answer sizing={latest} skills={skills} currency={team.currency} /> : null}
      <Limits />
      <TitleBlock figures={standingFigures(latest, team.zone)} />
    </>
  );
}

function Lead({ teamName }: { readonly teamName: string }) {
  return (
    <>
      How many people, on which shift patterns, the floors of {teamName} take at least cost, before
      anybody is named. A floor is the least number of people on duty. Sizing looks at a normal
      week: public holidays, dates that differ, clock changes and leave are left out, and wished
      floors count like firm ones.
    </>
  );
}

function Limits() {
  return (
    <div className="mt-9">
      <Caution>
        A sizing knows no rest times, leave or sickness and is no hiring advice: real teams need
        more. Floors that protect life come from the authority or the licensed person responsible.
      </Caution>
    </div>
  );
}
