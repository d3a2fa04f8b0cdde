/** Marks on sheets: the figures, what to look out for, then each step with its drawing. */
import { type Block, moved, overlay, row, rule, space, stack } from "@/lib/pdf/blocks";
import { compose } from "@/lib/pdf/compose";
import { longDate } from "@/lib/pdf/long-date";
import { type MarksDocument, type MarksStep } from "@/lib/pdf/marks-document";
import { type Group } from "@/lib/pdf/paginate";
import { inner, type MarksPaper, marksPapers, MM } from "@/lib/pdf/papers";
import { notched, pair, present, textLines } from "@/lib/pdf/parts";
import { tape, type TapeUnit } from "@/lib/pdf/signs";
import { drawStep } from "@/lib/pdf/step-drawing";
import { type TextStyle, type Typesetter, typesetter } from "@/lib/pdf/typesetter";
import { type PrintTools, writePdf } from "@/lib/pdf/write-pdf";
