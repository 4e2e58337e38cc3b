import { IARU_REGION_1, US_97 } from '@ferrite-row/levels';
import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { useClub } from '../../../api-client/club';
import { CautionBox } from '../../../shared-ui/caution-box';
import { ToggleField } from '../../../shared-ui/fields/toggle-field';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { useChooseRules } from '../api/rules';

const RULE_SETS = [IARU_REGION_1, US_97];

/** By which rules the calculators judge what may be sent; the choice is the club's, the decision never the portal's. */
export function ClubRules() {
  const club = useClub();
  const choosing = useChooseRules();
  if (!club.data) return null;
  const chosen = choosing.isPending ? choosing.variables : club.data.ruleSet;
  const rules = RULE_SETS.find(({ id }) => id === chosen);
  return (
    <Box component="section" aria-label="Rules" sx={{ maxWidth: 640, mt: '28px' }}>
      <SectionHeading>Rules</SectionHeading>
      <Box sx={{ display: 'grid', gap: '10px', mt: '10px' }}>
        <ToggleField
          label="The calculators go by"
          value={chosen}
          options={[
            { value: 'IARU-R1', label: IARU_REGION_1.title },
            { value: 'US-97', label: US_97.title },
          ]}
          onChange={(next) => choosing.mutate(next)}
        />
        {choosing.isError && <ProblemAlert error={choosing.error} title="The rules were not changed." />}
        {rules && (
          <>
            <Typography variant="small" component="p" sx={{ m: 0, color: 'token.ink2' }}>
              {rules.source}
            </Typography>
            <CautionBox kind="licence needed">{rules.caution}</CautionBox>
          </>
        )}
      </Box>
    </Box>
  );
}
