/**
 * Invented customers and their homes. No town, street or postcode area here exists; telephone numbers are Ofcom's for
 * drama; addresses end in domains that nobody can own. Supply numbers carry a right check digit on round figures.
 */
const seven = { rating_kW: 7.36, phases: '1', device_standard: 'yes', export_A: 0, grant_who: 'none' }
const TETHERED = { ...seven, outlet: 'tethered' }
const SOCKET = { ...seven, outlet: 'socket' }

const home = (name, mailbox, telephone, address, town, postcode, rest = {}) => ({
  customer: { name, email: mailbox ? `${mailbox}@example.org` : '', telephone },
  premises: { address, town, postcode, country: 'England', mpan: rest.mpan ?? '' },
  wanted: rest.wanted ?? TETHERED,
  note: rest.note ?? '',
  about: { tenure: 'owner', parking: 'Own drive', ...rest.about },
})

export const HOMES = {
  // Enquiries
  newToday: home('Farah Siddiqui', 'farah.siddiqui', '07700 900201', '18 Bellfounder Row', 'Quillham', 'UX4 2PD', { note: 'Car comes at the end of next month. Drive at the side of the house; board under the stairs.' }),
  noEmail: home('Mr Walter Pugh', '', '01632 960112', '2 Sexton Cottages, Long Ossing', 'Quillham', 'UX4 7LE', { note: 'No e-mail: telephone after four, or write.' }),
  longName: home('Dr Anastasia Konstantinidou-Featherstonehaugh-Okonkwo and Professor Bartholomew Featherstonehaugh-Okonkwo', 'anastasia.konstantinidou-featherstonehaugh-okonkwo', '07700 900203', 'The Old Cornmill and Millwright\'s Workshop (second entrance, behind the weighbridge), Upper Nether Marlbeck Lane, Little Ossing-under-Edge', 'Great Tidmere-on-the-Water', 'UX11 9WW', { wanted: SOCKET, note: 'Two households share the yard. Ask which meter.' }),
  tenantWaiting: home('Kwame Boateng', 'kwame.boateng', '07700 900204', 'Flat 3, 61 Ropewalk Court', 'Quillham', 'UX4 1RW', { wanted: { ...SOCKET, grant_who: 'renter' }, about: { tenure: 'tenant', parking: 'Allotted bay 3 behind the block' }, note: 'Rents; wants to know about the grant.' }),
  cancelled: home('Elspeth Marr', 'elspeth.marr', '07700 900205', '7 Cooper\'s Rise', 'Tidmere', 'UX6 3CR', { note: 'Compared two offers.' }),
  // Surveys booked
  surveyToday: home('Jun Takeda', 'jun.takeda', '07700 900211', '44 Saltpan Road', 'Quillham', 'UX4 5SP', { mpan: '110020044001' }),
  surveySoon: home('Niamh O\'Dowd', 'niamh.odowd', '07700 900212', '9 Lychgate Close', 'Marlbeck', 'UX5 2LC', { wanted: SOCKET, mpan: '110020009001' }),
  surveyNextWeek: home('Lindani Mokoena', 'lindani.mokoena', '07700 900213', '130 Quarry Bank', 'Tidmere', 'UX6 1QB'),
  // Surveyed
  fitsWell: home('Harriet Lowe', 'harriet.lowe', '07700 900221', '5 Vicar\'s Piece', 'Quillham', 'UX4 3VP', { mpan: '110020005001' }),
  smallFuse: home('Amit and Leena Rathod', 'rathod.family', '07700 900222', '27 Weaver Street', 'Quillham', 'UX4 4WS', { mpan: '110020027001' }),
  askFirst: home('Gwilym Parry', 'gwilym.parry', '07700 900223', 'Larkmoor House, Ossing Road', 'Marlbeck', 'UX5 8LH', { wanted: SOCKET, mpan: '110020081001' }),
  looped: home('Dorothy Ansah', 'dorothy.ansah', '01632 960124', '12 Coronet Terrace', 'Quillham', 'UX4 6CT', { mpan: '110020012001', about: { parking: 'Paved front garden with a dropped kerb' } }),
  unsafeService: home('Stefan Brandt', 'stefan.brandt', '07700 900225', '3 Foundry Lane', 'Tidmere', 'UX6 2FL', { wanted: SOCKET, mpan: '110020003001' }),
  // Installations booked
  bookedTomorrow: home('Chloe Mensah', 'chloe.mensah', '07700 900231', '71 Archer\'s Way', 'Quillham', 'UX4 8AW', { mpan: '110020071001' }),
  bungalow: home('Ronald Teague', 'ronald.teague', '01632 960132', 'Fold End, Sheepwash Track', 'Long Ossing', 'UX7 1FE', { mpan: '110020101001', about: { parking: 'Gravel hard standing beside the bungalow' } }),
  limitedBooked: home('Yusuf Demir', 'yusuf.demir', '07700 900233', '15 Tollgate Avenue', 'Marlbeck', 'UX5 4TA', { mpan: '110020015001' }),
  laterBooked: home('Ingrid Halvorsen', 'ingrid.halvorsen', '07700 900234', '88 Limekiln Road', 'Tidmere', 'UX6 5LK', { wanted: SOCKET, mpan: '110020088001' }),
  // On site
  deadTests: home('Marcus Bell', 'marcus.bell', '07700 900241', '20 Haymarket Close', 'Quillham', 'UX4 9HC', { mpan: '110020020001' }),
  readyToSign: home('Sunita Bhatt', 'sunita.bhatt', '07700 900242', '6 Pinfold Gardens', 'Quillham', 'UX4 2PG', { mpan: '110020006001' }),
  loopOutside: home('Peter Garside', 'peter.garside', '07700 900243', '33 Drovers Lane', 'Marlbeck', 'UX5 6DL', { wanted: SOCKET, mpan: '110020033001' }),
  unexpected: home('Hannah Levy', 'hannah.levy', '07700 900244', '52 Staithe Street', 'Tidmere', 'UX6 7SS', { mpan: '110020052001' }),
  paperSheet: home('Oluwaseun Bello', 'seun.bello', '07700 900245', '1 Bakehouse Yard', 'Quillham', 'UX4 1BY', { mpan: '110020001001' }),
  limiterOnSite: home('Catrin Vaughan', 'catrin.vaughan', '07700 900246', '10 Rushmere Drive', 'Marlbeck', 'UX5 1RD', { mpan: '110020010001' }),
  // Beyond the site
  wantsQuote: home('Bruno Ferreira', 'bruno.ferreira', '07700 900251', '24 Maltings Row', 'Quillham', 'UX4 7MR', { mpan: '110020024001' }),
  hasAccepted: home('Ruth Abernethy', 'ruth.abernethy', '07700 900252', '39 Fell View', 'Marlbeck', 'UX5 9FV', { mpan: '110020039001' }),
}
