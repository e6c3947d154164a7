import { type StudyRequest, studied } from './study'

/** Studies off the main thread, apart from the appraisal, which they would hold up: one reply to each request. */
self.addEventListener('message', ({ data }: MessageEvent<StudyRequest>) => self.postMessage(studied(data)))
