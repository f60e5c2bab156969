import type { Knex } from 'knex';
import { storyDay } from './dates';
import { demoId } from './identity';
import { demoUserId } from './people';

interface DemoBasis {
  highestVoltageKv: number;
  note: string;
  day: string;
}

interface DemoProject {
  code: string;
  title: string;
  kind: 'line' | 'yard';
  description: string;
  author: string;
  nominalVoltageKv: number;
  lightningKv: number;
  powerFrequencyKv: number;
  faultCurrentKa: number;
  rules: { unitsOutForLiveWork: number | null; maximumStringKinds: number | null };
  bases: DemoBasis[];
}

const ORVELLE = 't.orvelle@kigc.example';
const FELTHAM_OSEI = 'n.felthamosei@kigc.example';

/** Lines and yards of the invented Kelmarra region; voltages line to line, kV r.m.s., levels kV peak. */
const DEMO_PROJECTS: readonly DemoProject[] = [
  {
    code: 'KL221',
    title: 'Saltgrave - Ondara',
    kind: 'line',
    description: 'New single circuit, 117.86 km, 334 structures, 200 to 2310 m. In design.',
    author: ORVELLE,
    nominalVoltageKv: 220,
    lightningKv: 1050,
    powerFrequencyKv: 460,
    faultCurrentKa: 31.5,
    rules: { unitsOutForLiveWork: 2, maximumStringKinds: 6 },
    bases: [
      { highestVoltageKv: 220, note: 'First issue', day: '2025-06-02' },
      {
        highestVoltageKv: 245,
        note: 'Highest voltage is 245 kV; 220 kV was entered by mistake',
        day: '2025-06-30',
      },
    ],
  },
  {
    code: 'KL132',
    title: 'Ondara - Vintha Mine',
    kind: 'line',
    description: 'In service since 1987, to be re-insulated; 86.12 km, 265 structures, 1421 to 3900 m.',
    author: ORVELLE,
    nominalVoltageKv: 132,
    lightningKv: 650,
    powerFrequencyKv: 275,
    faultCurrentKa: 31.5,
    rules: { unitsOutForLiveWork: 1, maximumStringKinds: 5 },
    bases: [{ highestVoltageKv: 145, note: 'First issue', day: '2025-07-14' }],
  },
  {
    code: 'OND220',
    title: 'Ondara 220 kV yard',
    kind: 'yard',
    description: 'Extension of the 220 kV yard at 1420 m.',
    author: FELTHAM_OSEI,
    nominalVoltageKv: 220,
    lightningKv: 1050,
    powerFrequencyKv: 460,
    faultCurrentKa: 40,
    rules: { unitsOutForLiveWork: null, maximumStringKinds: null },
    bases: [{ highestVoltageKv: 245, note: 'First issue', day: '2025-08-04' }],
  },
  {
    code: 'OND132',
    title: 'Ondara 132 kV yard',
    kind: 'yard',
    description: 'Existing 132 kV yard at 1420 m, one new bay.',
    author: FELTHAM_OSEI,
    nominalVoltageKv: 132,
    lightningKv: 650,
    powerFrequencyKv: 275,
    faultCurrentKa: 31.5,
    rules: { unitsOutForLiveWork: null, maximumStringKinds: null },
    bases: [{ highestVoltageKv: 145, note: 'First issue', day: '2025-08-04' }],
  },
];

/** UTC+04:00; the sign of these zone names is the other way round. */
const SITE_TIME_ZONE = 'Etc/GMT-4';

const projectId = (code: string): string => demoId('project', code);

export const DEMO_PROJECT_IDS: ReadonlyMap<string, string> = new Map(
  DEMO_PROJECTS.map(({ code }) => [code, projectId(code)]),
);

export async function seedProjects(knex: Knex, today: string): Promise<void> {
  await knex('projects')
    .insert(
      DEMO_PROJECTS.map((project) => ({
        id: projectId(project.code),
        code: project.code,
        title: project.title,
        kind: project.kind,
        site_time_zone: SITE_TIME_ZONE,
        paper: 'A4',
        description: project.description,
        created_by: demoUserId(project.author),
        created_at: `${storyDay('2025-06-01', today)}T05:00:00Z`,
        updated_by: demoUserId(project.author),
        updated_at: `${storyDay('2025-06-01', today)}T05:00:00Z`,
      })),
    )
    .onConflict()
    .ignore();
  await knex('design_bases')
    .insert(
      DEMO_PROJECTS.flatMap((project) =>
        project.bases.map((basis, index) => toBasisRow(project, basis, index + 1, today)),
      ),
    )
    .onConflict()
    .ignore();
}

function toBasisRow(project: DemoProject, basis: DemoBasis, revision: number, today: string) {
  const system = {
    nominalVoltageKv: project.nominalVoltageKv,
    highestVoltageKv: basis.highestVoltageKv,
    frequencyHz: 50,
    neutralEarthing: 'effective',
    earthFault: 'cleared',
    insulationLevel: {
      lightningKv: project.lightningKv,
      switchingKv: null,
      powerFrequencyKv: project.powerFrequencyKv,
      switchingPhaseRatio: null,
    },
    faultCurrentKa: project.faultCurrentKa,
    faultDurationS: 1,
  };
  return {
    id: demoId('design basis', `${project.code} ${revision}`),
    project_id: projectId(project.code),
    revision,
    number: `DB-${project.code}`,
    basis: 'iec',
    system: JSON.stringify(system),
    rules: JSON.stringify(project.rules),
    note: basis.note,
    created_by: demoUserId(project.author),
    created_at: `${storyDay(basis.day, today)}T06:00:00Z`,
  };
}
