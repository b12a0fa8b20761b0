import { buildClient } from './buildClient.ts'
import { runCommand } from './runCommand.ts'
import { startLocal } from './startLocal.ts'

// npm start: everything on one loopback port, with the demo studio.
await runCommand(async (life) => {
  const { server, signIns } = await startLocal(life, buildClient)
  console.log(`\nProofcloth is open at ${server.url}`)
  if (signIns.length) {
    console.log('\nDemo sign-ins (invented people, drawn pictures):')
    for (const { email, password, who } of signIns) console.log(`  ${email.padEnd(30)} ${password}   ${who}`)
  }
  console.log('\nCtrl-C stops it; nothing is lost.')
})
