import { existsSync } from 'node:fs'
import { join } from 'node:path'
import { SetUpError, step } from './progress.js'
import { runCommand } from './runCommand.js'

/** What the product needs of Debian: the command that shows it is there, and the packages that bring it. */
export const HOST_PACKAGES = {
  mariadb: { command: 'mariadbd', packages: ['mariadb-server-core', 'mariadb-client-core'] },
  chromium: { command: 'chromium', packages: ['chromium'] },
  poppler: { command: 'pdftotext', packages: ['poppler-utils'] },
}

const FOLDERS = [...(process.env.PATH ?? '').split(':'), '/usr/sbin', '/sbin']
const hasCommand = (command) => FOLDERS.some((folder) => folder !== '' && existsSync(join(folder, command)))

/**
 * Installs from Debian's packages what is missing, by root or sudo.
 * @param {readonly (keyof typeof HOST_PACKAGES)[]} wanted
 * @throws SetUpError naming the packages when there is neither root nor sudo
 */
export async function ensureHostPackages(wanted) {
  const missing = wanted.map((name) => HOST_PACKAGES[name]).filter(({ command }) => !hasCommand(command))
  if (missing.length === 0) return
  const packages = missing.flatMap((entry) => entry.packages)
  const isRoot = process.getuid?.() === 0
  if (!isRoot && !hasCommand('sudo')) {
    throw new SetUpError(
      `These Debian packages are needed: ${packages.join(' ')}. Install them as root: apt-get install ${packages.join(' ')}`,
    )
  }
  const apt = async (...words) => {
    const command = ['env', 'DEBIAN_FRONTEND=noninteractive', 'apt-get', '-o', 'DPkg::Lock::Timeout=120', ...words]
    const [first, ...rest] = isRoot ? command : ['sudo', '-n', ...command]
    await runCommand(first, rest)
  }
  await step(`Installing ${packages.join(', ')} from Debian`, async () => {
    await apt('update')
    await apt('install', '--yes', '--no-install-recommends', ...packages)
  })
}
