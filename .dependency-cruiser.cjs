/**
 * The floors. A folder imports from the floors below it and never sideways or up.
 * This table is the only place that says which folder stands on which floor.
 */
const FLOORS = [
  ['report', 'exact'],
  ['elements'],
  ['notation'],
  ['species'],
  ['balance'],
  ['redox'],
  ['cell', 'audit'],
  ['amounts', 'potential', 'caution'],
  ['desk'],
  ['render'],
  ['cli', 'batch', 'http', 'page'],
];

/** The two folders of floor 0 know nothing of one another; the shells may call one another's public file only. */
const inFolders = (folders) => `^src/(${folders.join('|')})/`;

const upward = FLOORS.map((folders, floor) => ({
  name: `floor-${floor}-only-downward`,
  comment: `${folders.join(', ')} may import only from floors below ${floor}`,
  severity: 'error',
  from: { path: inFolders(folders) },
  to: { path: inFolders(FLOORS.slice(floor + 1).flat().concat('none')) },
}));

const SHELLS = FLOORS[FLOORS.length - 1];

const sideways = FLOORS.flatMap((folders, floor) =>
  folders.length < 2
    ? []
    : folders.map((folder) => ({
        name: `floor-${floor}-${folder}-not-sideways`,
        severity: 'error',
        from: { path: inFolders([folder]) },
        to: {
          path: inFolders(folders.filter((other) => other !== folder)),
          // The command line starts the other shells through the one file each that is named after its folder.
          ...(folders === SHELLS ? { pathNot: '^src/(batch/batch|http/serve|page/page)\\.ts$' } : {}),
        },
      })),
);

module.exports = {
  forbidden: [
    ...upward,
    ...sideways,
    { name: 'no-cycles', severity: 'error', from: {}, to: { circular: true } },
    {
      name: 'core-is-pure',
      comment: 'no Node module below the shells',
      severity: 'error',
      from: { path: '^src/', pathNot: inFolders(SHELLS) },
      to: { dependencyTypes: ['core'] },
    },
    {
      name: 'one-importer-of-fractions',
      severity: 'error',
      from: { path: '^src/', pathNot: '^src/exact/rational\\.ts$' },
      to: { path: 'node_modules/fraction\\.js' },
    },
    {
      name: 'no-test-code-in-src',
      severity: 'error',
      from: { path: '^src/' },
      to: { path: '^(test|fixtures)/' },
    },
    {
      name: 'only-declared-packages',
      severity: 'error',
      from: { path: '^src/' },
      to: { dependencyTypes: ['npm-dev', 'npm-no-pkg', 'npm-unknown', 'unknown'], dependencyTypesNot: ['type-only'] },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    exclude: { path: 'generated/' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.json' },
    enhancedResolveOptions: { exportsFields: ['exports'], conditionNames: ['import', 'node', 'default', 'types'] },
  },
};
