/**
 * What each call answers to whom, as statuses. `closed` is a visitor of a club that keeps its reading to members;
 * `author` wrote the proposal that the call is about, `member` is another. Everything a visitor reads, everybody reads.
 */
export const matrix = `
call                                                         visitor closed member author moderator admin

GET    /api/session                                              200    200    200    200       200   200
POST   /api/session                                              200    200    200    200       200   200
DELETE /api/session                                              204    204    204    204       204   204
PUT    /api/account/password                                     401    401    204    204       204   204

GET    /api/home                                                 200    401    200    200       200   200
GET    /api/shelves/{shelf}                                      200    401    200    200       200   200
GET    /api/shelves/{shelf}/{subject}                            200    401    200    200       200   200
GET    /api/pages/{shelf}/{subject}/{page}                       200    401    200    200       200   200
GET    /api/pages/{shelf}/{subject}/{page}/view                  200    401    200    200       200   200
GET    /api/pages/{shelf}/{subject}/{page}/revisions             200    401    200    200       200   200
GET    /api/pages/{shelf}/{subject}/{page}/revisions/{number}    200    401    200    200       200   200
GET    /api/pages/{shelf}/{subject}/{page}/compare               200    401    200    200       200   200
GET    /api/search                                               200    401    200    200       200   200
POST   /api/preview                                              200    401    200    200       200   200

GET    /api/start                                                401    401    200    200       200   200
GET    /api/proposals                                            401    401    200    200       200   200
POST   /api/proposals                                            401    401    201    201       201   201
GET    /api/proposals/{id}                                       401    401    404    200       200   200
POST   /api/proposals/{id}/versions                              401    401    404    200       403   403
POST   /api/proposals/{id}/notes                                 401    401    404    200       200   200
POST   /api/proposals/{id}/send                                  401    401    404    200       403   403
POST   /api/proposals/{id}/send-back                             401    401    404    403       200   200
POST   /api/proposals/{id}/decline                               401    401    404    403       200   200
POST   /api/proposals/{id}/withdraw                              401    401    404    200       403   403
POST   /api/proposals/{id}/publish                               401    401    404    403       200   200
`;
