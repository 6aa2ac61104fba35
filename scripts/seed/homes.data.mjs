/**
 * Invented customers and their homes. No town, street or postcode area here exists; telephone numbers are Ofcom's for
 * drama; addresses end in domains that nobody can own. Supply numbers carry a right check digit on round figures.
 */
const seven = { rating_kW: 7.36, phases: '1', device_standard: 'yes', export_A: 0, grant_who: 'none' }
const TETHERED = { ...seven, outlet: 'tethered' }
const SOCKET = { ...seven, outlet: 'socket' }

/** `since`: how many days ago the enquiry came. */
const home = (since, name, mailbox, telephone, address, town, postcode, rest = {}) => ({
  since,
  customer: { name, email: mailbox ? `${mailbox}@example.org` : '', telephone },
  premises: { address, town, postcode, country: 'England', mpan: rest.mpan ?? '' },
  wanted: rest.wanted ?? TETHERED,
  note: rest.note ?? '',
  about: { tenure: 'owner', parking: 'Own drive', ...rest.about },
})

export const HOMES = {
  // Enquiries
  newToday: home(0, 'Farah Siddiqui', 'farah.siddiqui', '07700 900201', '18 Bellfounder Row', 'Quillham', 'UX4 2PD', { note: 'Car comes at the end of next month. Drive at the side of the house; board under the stairs.' }),
  noEmail: home(2, 'Mr Walter Pugh', '', '01632 960112', '2 Sexton Cottages, Long Ossing', 'Quillham', 'UX4 7LE', { note: 'No e-mail: telephone after four, or write.' }),
  longName: home(4, 'Dr Anastasia Konstantinidou-Featherstonehaugh-Okonkwo and Professor Bartholomew Featherstonehaugh-Okonkwo', 'anastasia.konstantinidou-featherstonehaugh-okonkwo', '07700 900203', 'The Old Cornmill and Millwright\'s Workshop (second entrance, behind the weighbridge), Upper Nether Marlbeck Lane, Little Ossing-under-Edge', 'Great Tidmere-on-the-Water', 'UX11 9WW', { wanted: SOCKET, note: 'Two households share the yard. Ask which meter.' }),
  tenantWaiting: home(8, 'Kwame Boateng', 'kwame.boateng', '07700 900204', 'Flat 3, 61 Ropewalk Court', 'Quillham', 'UX4 1RW', { wanted: { ...SOCKET, grant_who: 'renter' }, about: { tenure: 'tenant', parking: 'Allotted bay 3 behind the block' }, note: 'Rents; wants to know about the grant.' }),
  cancelled: home(13, 'Elspeth Marr', 'elspeth.marr', '07700 900205', '7 Cooper\'s Rise', 'Tidmere', 'UX6 3CR', { note: 'Compared two offers.' }),
  // Surveys booked
  surveyToday: home(5, 'Jun Takeda', 'jun.takeda', '07700 900211', '44 Saltpan Road', 'Quillham', 'UX4 5SP', { mpan: '110020044001' }),
  surveySoon: home(4, 'Niamh O\'Dowd', 'niamh.odowd', '07700 900212', '9 Lychgate Close', 'Marlbeck', 'UX5 2LC', { wanted: SOCKET, mpan: '110020009001' }),
  surveyNextWeek: home(3, 'Lindani Mokoena', 'lindani.mokoena', '07700 900213', '130 Quarry Bank', 'Tidmere', 'UX6 1QB'),
  // Surveyed
  fitsWell: home(12, 'Harriet Lowe', 'harriet.lowe', '07700 900221', '5 Vicar\'s Piece', 'Quillham', 'UX4 3VP', { mpan: '110020005001' }),
  smallFuse: home(11, 'Amit and Leena Rathod', 'rathod.family', '07700 900222', '27 Weaver Street', 'Quillham', 'UX4 4WS', { mpan: '110020027001' }),
  askFirst: home(16, 'Gwilym Parry', 'gwilym.parry', '07700 900223', 'Larkmoor House, Ossing Road', 'Marlbeck', 'UX5 8LH', { wanted: SOCKET, mpan: '110020081001' }),
  looped: home(10, 'Dorothy Ansah', 'dorothy.ansah', '01632 960124', '12 Coronet Terrace', 'Quillham', 'UX4 6CT', { mpan: '110020012001', about: { parking: 'Paved front garden with a dropped kerb' } }),
  unsafeService: home(9, 'Stefan Brandt', 'stefan.brandt', '07700 900225', '3 Foundry Lane', 'Tidmere', 'UX6 2FL', { wanted: SOCKET, mpan: '110020003001' }),
  // Installations booked
  bookedTomorrow: home(20, 'Chloe Mensah', 'chloe.mensah', '07700 900231', '71 Archer\'s Way', 'Quillham', 'UX4 8AW', { mpan: '110020071001' }),
  bungalow: home(18, 'Ronald Teague', 'ronald.teague', '01632 960132', 'Fold End, Sheepwash Track', 'Long Ossing', 'UX7 1FE', { mpan: '110020101001', about: { parking: 'Gravel hard standing beside the bungalow' } }),
  limitedBooked: home(17, 'Yusuf Demir', 'yusuf.demir', '07700 900233', '15 Tollgate Avenue', 'Marlbeck', 'UX5 4TA', { mpan: '110020015001' }),
  laterBooked: home(14, 'Ingrid Halvorsen', 'ingrid.halvorsen', '07700 900234', '88 Limekiln Road', 'Tidmere', 'UX6 5LK', { wanted: SOCKET, mpan: '110020088001' }),
  // On site
  deadTests: home(21, 'Marcus Bell', 'marcus.bell', '07700 900241', '20 Haymarket Close', 'Quillham', 'UX4 9HC', { mpan: '110020020001' }),
  readyToSign: home(30, 'Sunita Bhatt', 'sunita.bhatt', '07700 900242', '6 Pinfold Gardens', 'Quillham', 'UX4 2PG', { mpan: '110020006001' }),
  loopOutside: home(27, 'Peter Garside', 'peter.garside', '07700 900243', '33 Drovers Lane', 'Marlbeck', 'UX5 6DL', { wanted: SOCKET, mpan: '110020033001' }),
  unexpected: home(26, 'Hannah Levy', 'hannah.levy', '07700 900244', '52 Staithe Street', 'Tidmere', 'UX6 7SS', { mpan: '110020052001' }),
  paperSheet: home(24, 'Oluwaseun Bello', 'seun.bello', '07700 900245', '1 Bakehouse Yard', 'Quillham', 'UX4 1BY', { mpan: '110020001001' }),
  limiterOnSite: home(29, 'Catrin Vaughan', 'catrin.vaughan', '07700 900246', '10 Rushmere Drive', 'Marlbeck', 'UX5 1RD', { mpan: '110020010001' }),
  // Signed and beyond
  readyPlain: home(28, 'Gareth Nwosu', 'gareth.nwosu', '07700 900261', '17 Almshouse Lane', 'Quillham', 'UX4 3AL', { mpan: '110020017001' }),
  readyOdd: home(30, 'Beatrix Thorne', 'beatrix.thorne', '07700 900262', '4 Ferry Steps', 'Tidmere', 'UX6 8FS', { mpan: '110020004001' }),
  sentBack: home(31, 'Imran Qureshi', 'imran.qureshi', '07700 900263', '66 Chandlery Way', 'Quillham', 'UX4 5CW', { mpan: '110020066001' }),
  countersigned: home(33, 'Lucy Farrow', 'lucy.farrow', '07700 900264', '21 Orchard Bank', 'Marlbeck', 'UX5 3NB', { mpan: '110020021001' }),
  handedOver: home(41, 'Edwin Castle', 'edwin.castle', '07700 900265', '8 Paddock Mews', 'Quillham', 'UX4 8PM', { mpan: '110020008001' }),
  promised: home(38, 'Mei-Ling Zhou', 'meiling.zhou', '07700 900266', '14 Bobbin Mill Road', 'Tidmere', 'UX6 4BM', { mpan: '110020014001' }),
  // Quotes
  wantsQuote: home(15, 'Bruno Ferreira', 'bruno.ferreira', '07700 900251', '24 Maltings Row', 'Quillham', 'UX4 7MR', { mpan: '110020024001' }),
  hasAccepted: home(19, 'Ruth Abernethy', 'ruth.abernethy', '07700 900252', '39 Fell View', 'Marlbeck', 'UX5 9FV', { mpan: '110020039001' }),
}
