import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import type { ReactNode } from 'react';
import { Banner } from '../../../shared-ui/banner';
import { PageTitle } from '../../../shared-ui/page-title';
import { PhoneBar } from '../../../shared-ui/phone-bar';
import { token } from '../../../shared-ui/tokens';
import { usePhone } from '../../../shared-ui/use-phone';
import { PutOnBuild } from '../build/put-on-build';
import { VisuallyHidden } from '../../../shared-ui/visually-hidden';
import { useCopy } from '../results/copying';
import { StillWords } from '../results/still-words';
import { familyName, type Family } from './families';
import { FamilyRow } from './family-row';

interface BenchFrameProps {
  family: Family;
  /** The address with what was typed. */
  link: () => string;
  /** What is wrong, where it belongs to no field. */
  problem?: string;
  /** The result as plain lines, for a letter or a notebook; none while there is no result. */
  text: string | undefined;
  /** The answer in a sentence, read aloud once the hand rests. */
  spoken: string;
  inputs: ReactNode;
  /** The answer line; on a phone it is pinned over the bottom bar. */
  answer: ReactNode;
  /** Picture and table, in this order. */
  children: ReactNode;
}

const PINNED = {
  position: 'fixed',
  left: 0,
  right: 0,
  bottom: 62,
  zIndex: 'appBar',
  maxHeight: '38dvh',
  overflowY: 'auto',
  borderTop: `1.5px solid ${token('ink')}`,
  backgroundColor: token('sheet'),
  '& > section': { border: 0, borderRadius: 0 },
} as const;

/** What every family's page has: title, families, inputs at the left, results at the right, and what to do with them. */
export function BenchFrame(props: BenchFrameProps) {
  const { family, link, problem, text, spoken, inputs, answer, children } = props;
  const isPhone = usePhone();
  const copy = useCopy();
  const name = familyName(family);
  const copyLink = (
    <Button variant="text" onClick={() => copy(link(), 'Link copied, with what you typed.')}>
      Copy link
    </Button>
  );
  const copyText = (
    <Button disabled={text === undefined} onClick={() => text !== undefined && copy(text, 'Copied as text.')}>
      Copy as text
    </Button>
  );
  const onBuild = <PutOnBuild family={family} link={link} text={text} />;
  const actions = (
    <>
      {copyLink}
      {copyText}
      {onBuild}
    </>
  );
  const title = (beside?: ReactNode) => (
    <PageTitle tab={`Level bench, ${name.toLowerCase()}`} actions={beside}>
      Level bench, <b>{name.toLowerCase()}</b>
    </PageTitle>
  );
  const page = (
    <>
      {inputs}
      {problem && (
        <Banner kind="failed" title="This cannot be worked out.">
          {problem}
        </Banner>
      )}
    </>
  );
  return (
    <>
      <PhoneBar title={name} backTo="/level-bench" backLabel="All families" end={copyLink} />
      {isPhone ? <VisuallyHidden as="div">{title()}</VisuallyHidden> : title(actions)}
      <FamilyRow />
      <Box
        sx={{
          display: 'grid',
          gridTemplateColumns: { xs: 'minmax(0, 1fr)', md: '286px minmax(0, 1fr)' },
          gap: { xs: '4px 30px', md: '30px' },
          mt: { xs: 0, md: '18px' },
          pb: { xs: '38dvh', md: 0 },
        }}
      >
        <Box sx={{ minWidth: 0 }}>{page}</Box>
        <Box sx={{ minWidth: 0 }}>
          {isPhone ? <Box sx={PINNED}>{answer}</Box> : answer}
          {children}
          {isPhone && (
            <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: '8px', mt: '16px' }}>
              {copyText} {onBuild}
            </Box>
          )}
        </Box>
      </Box>
      <StillWords words={spoken} />
    </>
  );
}
