/*
 * Rosters of the demo, found by the product's own runs (both proven the cheapest). One letter a day:
 * E D L N are the shift kinds, a small letter is a shift in the second skill, a dot is a day off.
 */

/** The running period, as published. */
export const runningRoster: Readonly<Record<string, string>> = {
  'Maren Oduya': 'N.LLLNN.DEDN.L.L.NN..LLN.ELL',
  'Tobias Lindrao': 'LL.N.ELN.LN...L.LL.N.EEDE.EN',
  'Ysolde Amankar': 'EDDDN.EEEDE.N.NN.DL.L.DLLL..',
  'Pavel Dristan': 'DEN.E...N..EEN.EEE.LN..E.D.E',
  'Noor Haldane': '.N.EDL.LLN.D.EEDN.D..NN.NNN.',
  'Ciaran Vought': '..E....D..LLL.D.D.EEED..D...',
  'Ione Baptisto': 'EDDDE.N.N.LL..DDELL.NN.N.EEE',
  'Kwabena Tull': 'N.EEEL.D....EEEEE.E..DDEEE..',
  'Lucja Mirov': 'EEELN..L.DEEEN..DEL.EL.ELLN.',
  'Hana Quill': 'L.LLLN.LLLLL.ENN.DD..EN.ED.N',
  'Desmond Ferlow': 'DN.EDL.EDEE.LLLL.E...ELLLL.L',
  'Anouk Tessaly': '.L....L.LL.D..E.LL.LL.E...L.',
  'Ravi Thornby': 'ddddd.EEEN.d..eLN.EE.LLLN..L',
  'Sunniva Adeyo': 'LLLlL...EEDEN..EnNNN.n.DDeL.',
  'Bram Okell': 'E.E.EEEN.LLLNN.N.ENNN.LLLN..',
  'Petra Vanholt': 'NNnn.elLN.n.lllLl.Ell.eN.n..',
  'Jun Marisco': '.eN..een.NNn...E.N.ee.N.N.ee',
  'Elspeth Nakano': '.EL.LLL.E.EELLL.LLL..EEEE.EE',
  'Mateo Grindle': 'LL.NNNN.L..N..N.E..LLL...LNN',
  'Farah Wexcombe': 'EEEeE..eDeE.eeeDE.DeeLL.EEll',
  'Odile Brandosei': '...EL....E..LL.L.L.EL....DEE',
  'Timur Ashgrove': 'LLLL.E.ELLLL..L.DEEL.EDLLL..',
  'Gwen Palliato': '......EDEDD.EE...D.....ED.LL',
  'Zuri Hallam': '.....LLL...E..DEL.L.EDED....',
};

/** The draft, as its run left it before Tobias Lindrao's leave took two shifts away. */
export const draftRoster: Readonly<Record<string, string>> = {
  'Maren Oduya': 'N.LNN.N.EDEE.......N.DDDLN..',
  'Tobias Lindrao': '.EDEEN.N.EDL..DNNN.EEN.EELL.',
  'Ysolde Amankar': 'DDEL...D.NN.LL.ELLLL.EEN.DNN',
  'Pavel Dristan': '.N..DEELN..DNNN.D.D.LLLLN...',
  'Noor Haldane': 'LLN.L..EDLLN.ELL.LN.N.N.DEEL',
  'Ciaran Vought': 'E..D.LL.L...E.EDEEE........E',
  'Ione Baptisto': 'LL.EEEED.LLLL.NN..E..LLLLL.E',
  'Kwabena Tull': 'EED.ELLN.ELL..LLN.EEEE.NN.L.',
  'Lucja Mirov': 'D.LLL..EDEEN..EDELL..LL.D...',
  'Hana Quill': '.EED.LL.......D.D.D.EDN.EENN',
  'Desmond Ferlow': '.LLLL..EEDDE.EE.NNNN.EEE.LL.',
  'Anouk Tessaly': '...E....E.EE..LLL..L..EL.DE.',
  'Ravi Thornby': 'LNN.D..LLN.DLL.EELL.N.DDEE.L',
  'Sunniva Adeyo': 'n.EelNN.LLN.NN.ELLl..N.ELl.L',
  'Bram Okell': 'LLLL.NN.N.E.LLL.ENNNN.LLLN..',
  'Petra Vanholt': 'edNN.eeN.N.EelNN.eEll.N.En..',
  'Jun Marisco': 'nN.nn..ln.N.ee...e.elN.N..ee',
  'Elspeth Nakano': 'EEE.EEE.LLL.EE.LLL...EEE.ELL',
  'Mateo Grindle': '....N..EEE.NNN..N..LL...N.NN',
  'Farah Wexcombe': 'L.EE.lllLL.l..eeEe.eel.EEEee',
  'Odile Brandosei': 'DE.L..L.EEDE..EED.EL.EE...EE',
  'Timur Ashgrove': '...DDEED.DLLL.LLLLL..DLLLL.L',
  'Gwen Palliato': '.LL.LL.L...DEL...E..EL.DDD..',
  'Zuri Hallam': 'EDD.E..ED.E..EDD..DEL.D...L.',
};
