import { join } from 'node:path';
import type { Database } from './db/client.ts';
import type { Env } from './env.ts';
import { accountRepo } from './features/account/repo.ts';
import { accountRoutes } from './features/account/routes.ts';
import { accountService } from './features/account/service.ts';
import { drillRepo } from './features/drills/repo.ts';
import { drillRoutes } from './features/drills/routes.ts';
import { drillService } from './features/drills/service.ts';
import { familyRoutes } from './features/families/routes.ts';
import { familyService } from './features/families/service.ts';
import { readCatalogue, type LessonCatalogue } from './features/lessons/catalogue.ts';
import { lessonRepo } from './features/lessons/repo.ts';
import { lessonRoutes } from './features/lessons/routes.ts';
import { lessonService } from './features/lessons/service.ts';
import { mailboxRoutes } from './features/mailbox/routes.ts';
import { mailboxService } from './features/mailbox/service.ts';
import { practiceAccountRepo } from './features/practice/account-repo.ts';
import { practiceRepo } from './features/practice/repo.ts';
import { practiceRoutes } from './features/practice/routes.ts';
import { practiceService } from './features/practice/service.ts';
import { progressRepo } from './features/progress/repo.ts';
import { progressRoutes } from './features/progress/routes.ts';
import { progressService } from './features/progress/service.ts';
import { sampleRoutes } from './features/sample/routes.ts';
import { sampleService } from './features/sample/service.ts';
import type { Auth } from './http/auth.ts';
import { goodbyeCookies, passwordCheck, sessionExtender } from './http/auth-tools.ts';
import type { Route } from './http/route.ts';
import type { Tries } from './http/tries.ts';
import { projectRoot } from './project-root.ts';

export interface FeatureDeps {
  env: Env;
  database: Database;
  auth: Auth;
  tries: Tries;
  now: () => Date;
  /** Where lessons are read from; the project's content unless given. */
  contentFolder?: string;
}

/** Reads the lessons once; anew each time while they are being written. */
function lessonCatalogue(folder: string, keep: boolean): () => Promise<LessonCatalogue> {
  let read: Promise<LessonCatalogue> | null = null;
  return () => {
    if (!keep || read === null) {
      read = readCatalogue(folder);
      // A failed reading is not kept: the next request tries again.
      read.catch(() => (read = null));
    }
    return read;
  };
}

/** Wires every feature from its parts: the one place where they meet. */
export function featureRoutes({ env, database, auth, tries, now, contentFolder }: FeatureDeps): Route[] {
  const { db, pool } = database;
  const practiceAccount = practiceAccountRepo(db);
  const lessonsRepo = lessonRepo(db);

  const practice = practiceService({ repo: practiceRepo(db, pool), zone: env.TIME_ZONE, now });
  const progress = progressService(progressRepo(db), now);
  const lessons = lessonService({
    repo: lessonsRepo,
    catalogue: lessonCatalogue(contentFolder ?? join(projectRoot, 'content'), env.NODE_ENV !== 'development'),
    checkpointsDone: practice.closedCheckpoints,
    now,
  });
  const account = accountService({
    repo: accountRepo(db),
    tries,
    verifyPassword: passwordCheck(auth),
    exportParts: [practiceAccount.exportOf, lessonsRepo.exportOf],
    onDelete: [practiceAccount.anonymize, (writer, { userId }) => lessonsRepo.forget(writer, userId)],
    now,
  });
  const hasMailbox = (env.DEMO || env.NODE_ENV === 'development') && env.MAILBOX_URL !== undefined;
  const mailbox = hasMailbox && env.MAILBOX_URL !== undefined ? mailboxService(env.MAILBOX_URL) : null;

  return [
    // Routes are tried in this order: what is asked for most comes first.
    ...practiceRoutes(practice, progress),
    ...accountRoutes({
      account,
      mailbox: hasMailbox,
      extendSession: sessionExtender(auth),
      goodbyeCookies: goodbyeCookies(env.APP_URL),
    }),
    ...lessonRoutes(lessons),
    ...mailboxRoutes(mailbox),
    ...sampleRoutes(sampleService()),
    ...drillRoutes(drillService(drillRepo(db), practice)),
    ...progressRoutes(progress),
    ...familyRoutes(familyService()),
  ];
}
