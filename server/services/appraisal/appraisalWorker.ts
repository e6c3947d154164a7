import { parentPort } from 'node:worker_threads'
import type { AppraisalJob } from './appraisalJob'
import { doAppraisalJob } from './doAppraisalJob'

/** Runs in a thread of its own: one job in, one outcome out. */
parentPort?.on('message', (job: AppraisalJob) => parentPort?.postMessage(doAppraisalJob(job)))
