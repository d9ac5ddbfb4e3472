import { answerTasks } from '../platform/threads/answer-tasks.js';
import { print } from './print.js';

answerTasks(print);
