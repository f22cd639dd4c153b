/**
 * Which way imports may run (types count). The table stands in prose in DEVELOPERS.md; this is the one that is
 * enforced. `room(from, may)` forbids everything inside the project that is not named in `may`.
 */
const leaves = '^lib/(units|errors)\\.ts$';
const pure = ['^lib/(geometry|engine|optimise|room|editor|drawing|access)/', leaves];

const room = (name, from, may) => ({
  name,
  severity: 'error',
  from: { path: from },
  to: { path: '^(app|components|workers|lib|db|tests|instrumentation|proxy)', pathNot: [from, ...may] },
});

const without = (name, from, packages) => ({
  name,
  severity: 'error',
  from: { path: from },
  to: { path: packages.map((it) => `^node_modules/(@types/)?${it}(/|$)`) },
});

const noCore = (name, from) => ({
  name,
  severity: 'error',
  from: { path: from },
  to: { dependencyTypes: ['core'] },
});

const interfacePackages = ['react', 'react-dom', 'konva', 'react-konva', 'next', 'next-auth'];
const dataPackages = ['drizzle-orm', '@libsql'];

module.exports = {
  forbidden: [
    { name: 'no-circles', severity: 'error', from: {}, to: { circular: true } },
    { name: 'found', severity: 'error', from: {}, to: { couldNotResolve: true } },
    room('leaves', leaves, []),
    room('geometry', '^lib/geometry/', [leaves]),
    room('engine', '^lib/engine/', ['^lib/geometry/', leaves]),
    room('room', '^lib/room/', ['^lib/engine/types\\.ts$', '^lib/geometry/', leaves]),
    room('editor', '^lib/editor/', ['^lib/room/', '^lib/geometry/', leaves]),
    room('drawing', '^lib/drawing/', ['^lib/room/', '^lib/engine/types\\.ts$', '^lib/geometry/', leaves]),
    room('access', '^lib/access/', [leaves]),
    room('workers', '^workers/', ['^lib/(engine|room|geometry)/', leaves]),
    room('db', '^db/', ['^lib/(room|access|geometry)/', '^lib/engine/types\\.ts$', leaves]),
    room('server', '^lib/server/', ['^db/', ...pure]),
    room('client', '^lib/client/', ['^lib/(room|access)/', leaves]),
    room('components', '^components/', ['^lib/client/', '^workers/', ...pure]),
    room('app', '^app/', ['^components/', '^lib/server/', '^lib/client/', ...pure]),
    room('start', '^(instrumentation|proxy)\\.ts$', ['^lib/(server|access)/', leaves]),
    without('engine-alone', '^lib/(geometry|engine)/', [...interfacePackages, ...dataPackages, 'zod']),
    without('pure-of-interface', '^(lib/(room|editor|drawing|access|optimise)|workers)/', [
      ...interfacePackages,
      ...dataPackages,
    ]),
    without('db-of-interface', '^db/', interfacePackages),
    without('server-of-interface', '^lib/server/', ['react-dom', 'konva', 'react-konva']),
    without('client-of-interface', '^lib/client/', [...interfacePackages, ...dataPackages]),
    noCore('pure-of-node', '^(lib/(geometry|engine|room|editor|drawing|access|client)|workers|components)/'),
  ],
  options: {
    tsConfig: { fileName: 'tsconfig.json' },
    tsPreCompilationDeps: true,
    doNotFollow: { path: 'node_modules' },
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'require', 'node', 'default', 'types'],
    },
  },
};
