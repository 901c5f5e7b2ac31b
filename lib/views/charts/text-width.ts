import type { ChartFace } from './marks'

/*
 * How wide words will be, so that label gaps fit without asking a browser. Advance widths in thousandths of an em for
 * U+0020 to U+007E, read from the files in fonts/pdf with tabular figures on; tests/views/charts/text-width.test.ts reads
 * the files again. Kerning is left out: it only narrows (up to a tenth in capitals), and a gap may be a little wide.
 */
const WIDTHS: Record<string, readonly number[]> = {
  'text-400': numbers(
    '280 286 301 651 592 919 731 160 299 299 485 606 210 362 210 387 632 632 632 632 632 632 632 632 632 632 210 210 553 628 553 480 778 626 613 645 669 569 552 694 694 392 512 631 541 824 693 714 592 724 614 592 558 690 593 856 623 575 607 317 387 344 552 372 243 525 566 485 564 538 314 558 550 252 245 492 262 845 550 548 566 574 349 471 326 540 461 684 481 449 460 344 237 344 555',
  ),
  'text-600': numbers(
    '303 298 362 730 604 953 727 195 324 324 485 598 252 369 253 424 632 632 632 632 632 632 632 632 632 632 253 253 564 617 564 526 780 662 634 654 683 589 562 711 699 415 546 654 548 848 710 737 617 747 639 604 592 687 628 877 666 627 615 333 424 344 573 391 274 544 587 502 586 555 349 582 565 285 255 536 301 870 565 567 587 591 368 497 360 559 509 723 522 499 492 370 249 370 543',
  ),
  'head-700': numbers(
    '246 299 417 623 562 813 729 231 268 267 427 583 217 351 221 463 574 584 601 587 589 585 563 580 567 544 221 224 491 565 491 456 804 788 666 668 766 596 597 732 814 340 445 737 552 988 819 778 642 781 686 562 601 794 795 1130 717 709 625 338 462 338 534 444 307 550 579 480 594 522 386 514 643 320 277 613 322 917 643 561 602 586 438 436 382 620 602 881 574 592 482 346 259 346 589',
  ),
  'head-800': numbers(
    '240 301 430 632 568 821 738 237 269 268 427 583 220 361 224 472 573 577 601 581 586 583 561 571 561 543 224 228 497 565 497 464 805 801 676 668 769 598 597 732 822 352 453 748 555 1001 829 783 654 786 694 568 602 806 805 1135 718 711 630 344 470 344 547 464 318 561 587 483 603 525 392 518 657 338 282 624 339 935 657 564 610 599 444 440 389 634 604 884 582 591 486 349 266 349 588',
  ),
  'crate-400': numbers(
    '260 363 525 700 539 898 739 300 374 374 454 540 330 379 330 429 680 680 680 680 680 680 680 680 680 680 330 330 541 540 541 521 944 687 670 568 680 616 576 660 716 330 425 683 541 885 716 698 645 698 674 612 581 690 663 996 678 633 618 399 429 399 426 400 311 558 578 465 578 557 437 578 588 299 299 576 299 857 588 572 578 578 425 498 427 586 551 846 566 588 534 381 305 381 497',
  ),
}

/** The mono face: one width, and a word space drawn in by 0.28 em. */
const FIG = { advance: 632, space: 632 - 280 }

/** Letters outside the table (°, −, ø, Ł) are about as wide as a figure. */
const OTHER = 632

/** Width of words in px. */
export function textWidth(text: string, face: ChartFace, size: number, weight = 400): number {
  let thousandths = 0
  for (const letter of text) thousandths += advance(letter, face, weight)
  return (thousandths * size) / 1000
}

function advance(letter: string, face: ChartFace, weight: number): number {
  const code = letter === '\u00a0' ? 32 : (letter.codePointAt(0) ?? 32)
  if (face === 'fig') return code === 32 ? FIG.space : FIG.advance
  const heavy = face === 'head' ? (weight >= 800 ? 800 : 700) : face === 'text' && weight >= 600 ? 600 : 400
  return WIDTHS[`${face}-${heavy}`]?.[code - 32] ?? OTHER
}

function numbers(list: string): number[] {
  return list.split(' ').map(Number)
}
