/**
 * Who may import whom: only downwards.
 *
 *   app → components, lib        components → lib/client, pure lib
 *   lib/services → db, parsers, pure lib, access        db → types of pure lib
 *   parsers, audit, corrections, comparison → network, estimates → schedule → nothing
 */
const PURE = '^lib/(schedule|network|estimates|audit|corrections|comparison|contract)/';
const PURE_OR_PARSERS = `${PURE}|^parsers/`;

/** Only what `allowed` names (of our own files) may be imported from `from`. */
const only = (name, from, allowed, comment) => ({
  name,
  comment,
  severity: 'error',
  from: { path: from },
  to: { path: '^(app|components|db|lib|parsers)/', pathNot: allowed },
});

const never = (name, from, to, comment) => ({ name, comment, severity: 'error', from, to });

module.exports = {
  forbidden: [
    // Downwards only.
    only('schedule-imports-nothing', '^lib/schedule/', '^lib/schedule/'),
    only('network-above-schedule', '^lib/(network|estimates)/', '^lib/(network|estimates|schedule)/'),
    only(
      'pure-lib-above-network',
      '^lib/(audit|corrections|comparison)/',
      '^lib/(audit|corrections|comparison|network|estimates|schedule)/',
    ),
    only('parsers-above-schedule', '^parsers/', '^(parsers|lib/(schedule|network|estimates|corrections))/'),
    only('contract-is-shapes', '^lib/contract/', '^lib/(contract|schedule)/'),
    only('client-talks-http', '^lib/client/', `^lib/client/|${PURE}`),
    only('components-below-app', '^components/', `^components/|^lib/client/|${PURE}`),
    only('app-holds-no-logic', '^app/', `^(app|components|lib)/`, 'Pages and handlers hold no SQL.'),
    only('db-knows-types', '^db/(?!seed/)', `^db/|${PURE}`),
    only('seed-uses-services', '^db/seed/', `^db/|^parsers/|^lib/(services|access)/|${PURE}`),
    only('access-below-services', '^lib/access/', `^lib/access/|^db/|${PURE}`),
    only(
      'services-below-http',
      '^lib/services/',
      `^(db|parsers)/|^lib/(services|access|mail|jobs|simulation)/|${PURE}`,
    ),
    only('http-below-app', '^lib/http/', `^lib/(http|access|services)/|${PURE}`),
    never('commands-are-the-top', { pathNot: '^lib/commands/' }, { path: '^lib/commands/' }),

    // What is pure stays pure.
    never(
      'pure-imports-no-framework',
      { path: PURE_OR_PARSERS },
      { path: 'node_modules/(react|react-dom|next|next-auth|pg|drizzle-orm|pino)/' },
    ),
    never(
      'pure-imports-no-system',
      { path: PURE_OR_PARSERS },
      { dependencyTypes: ['core'], pathNot: '^(node:)?(zlib|buffer|string_decoder|util)$' },
      'No files, no processes, no network; the bytes are an argument.',
    ),

    // The database has one door, and the owner of the tables a narrower one.
    never(
      'only-db-imports-drizzle',
      { pathNot: '^(db/|drizzle\\.config\\.ts$)' },
      { path: 'node_modules/(drizzle-orm|drizzle-kit|pg)/' },
    ),
    never(
      'only-set-up-is-owner',
      { pathNot: '^(db/(owner|seed/)|lib/commands/|tests/)' },
      { path: '^db/owner\\.ts$' },
    ),

    // Hygiene.
    never('no-circular', {}, { circular: true, viaOnly: { dependencyTypesNot: ['type-only'] } }),
    never('no-unresolvable', {}, { couldNotResolve: true }),
    never('no-test-in-product', { pathNot: '^(tests|lib/commands)/' }, { path: '^tests/' }),
    never(
      'no-dev-package-in-product',
      { path: '^(app|components|db|lib|parsers)/', pathNot: '^lib/commands/' },
      { dependencyTypes: ['npm-dev'], dependencyTypesNot: ['type-only'] },
    ),
    never('no-undeclared-package', {}, { dependencyTypes: ['npm-no-pkg', 'npm-unknown'] }),
    never(
      'no-orphans',
      { orphan: true, pathNot: '\\.d\\.m?ts$|^app/' },
      {},
      'Nothing imports it and it imports nothing: is it still needed?',
    ),
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '^(\\.next|\\.plumbrow|\\.plumbrow-test)/' },
    tsConfig: { fileName: 'tsconfig.json' },
    tsPreCompilationDeps: true,
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'node', 'default', 'types'],
      mainFields: ['module', 'main', 'types'],
    },
  },
};
