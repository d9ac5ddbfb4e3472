import { answerTasks } from '../platform/threads/answer-tasks.js';
import { renderBuildSheet } from './render.js';

answerTasks(renderBuildSheet);
