import * as z from 'zod';
import { questionText } from '#shared/agreements/question-schema';

/** What is entered to answer a client. */
export const answerFormSchema = z.strictObject({ text: questionText });
