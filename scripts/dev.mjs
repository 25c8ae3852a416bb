// npm run dev: the built product's database and mail catcher, with the compiler, the server and Vite watching.
import { join } from 'node:path'
import { build } from './system/build.mjs'
import { Children } from './system/children.mjs'
import { needDebianPackages } from './system/debian-packages.mjs'
import { installNodePackages } from './system/node-packages.mjs'
import { root } from './system/places.mjs'
import { say } from './system/say.mjs'
import { startWadestone, stopWadestone } from './system/wadestone.mjs'

const children = new Children()
installNodePackages()
needDebianPackages('postgresql')
build()
const dataFolder = process.env.WADESTONE_DATA
// The browser opens Vite's address, and its requests come from there.
const watching = await startWadestone({
  children,
  dataFolder,
  wantedPort: 3000,
  watch: true,
  publicOrigin: 'http://127.0.0.1:5173',
})
children.start('compiler', [join(root, 'node_modules/typescript/bin/tsc'), '-b', '-w', 'shared', 'server'], {
  shows: true,
})
children.start('vite', [join(root, 'node_modules/vite/bin/vite.js')], {
  shows: true,
  cwd: join(root, 'client'),
  env: { API_ADDRESS: watching.address },
})
say(`API: ${watching.address}, mail: ${watching.mailPage}. Stop with Ctrl-C.`)
for (const signal of ['SIGINT', 'SIGTERM']) {
  process.on(signal, () => void stopWadestone({ children, dataFolder }).then(() => process.exit(0)))
}
