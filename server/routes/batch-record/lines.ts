import {
  batchEvent,
  batchNote,
  eventCreate,
  eventWrite,
  noteCreate,
  noteWrite,
  reading,
  readingCreate,
  readingWrite,
} from '#shared/api/reading.ts';
import { api } from '#shared/api/urls.ts';
import { pathOf } from '../../http/pathOf.ts';
import { addEvent, editEvent, removeEvent } from './events.ts';
import { lineRoutes } from './lineRoutes.ts';
import { addNote, editNote, removeNote } from './notes.ts';
import { addReading, editReading, removeReading } from './readings.ts';

const readings = lineRoutes({
  addresses: {
    all: pathOf(api.readings(':brewery', ':id')),
    single: pathOf(api.reading(':brewery', ':id', ':readingId')),
  },
  param: 'readingId',
  words: {
    add: { name: 'addReading', summary: 'Write a reading of a batch down' },
    edit: { name: 'editReading', summary: 'Change a reading' },
    remove: { name: 'deleteReading', summary: 'Delete a reading' },
  },
  row: reading,
  create: readingCreate,
  write: readingWrite,
  add: addReading,
  edit: editReading,
  remove: removeReading,
});

const notes = lineRoutes({
  addresses: {
    all: pathOf(api.notes(':brewery', ':id')),
    single: pathOf(api.note(':brewery', ':id', ':noteId')),
  },
  param: 'noteId',
  words: {
    add: { name: 'addBatchNote', summary: 'Write a note on a batch' },
    edit: { name: 'editBatchNote', summary: 'Change one’s own note' },
    remove: { name: 'deleteBatchNote', summary: 'Delete a note' },
  },
  row: batchNote,
  create: noteCreate,
  write: noteWrite,
  add: addNote,
  edit: editNote,
  remove: removeNote,
});

const events = lineRoutes({
  addresses: {
    all: pathOf(api.events(':brewery', ':id')),
    single: pathOf(api.event(':brewery', ':id', ':eventId')),
  },
  param: 'eventId',
  words: {
    add: { name: 'addBatchEvent', summary: 'Plan something for a batch, or note that it was done' },
    edit: { name: 'editBatchEvent', summary: 'Change it, or note that it was done' },
    remove: { name: 'deleteBatchEvent', summary: 'Delete it' },
  },
  row: batchEvent,
  create: eventCreate,
  write: eventWrite,
  add: addEvent,
  edit: editEvent,
  remove: removeEvent,
});

/** Readings, notes and events: they differ in what they say, not in how they are written. */
export const linesOfARecord = [...readings, ...notes, ...events];
