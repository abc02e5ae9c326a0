# The rooms of src and what each may include; the one copy of this table.
#
# Read by src/CMakeLists.txt, which links the rooms accordingly, and by check_rooms.cmake, which reads the includes.
# A room may always include itself.  Each room stands after those it includes.
set(assize_allow_base)
set(assize_allow_store base)
set(assize_allow_field base)
set(assize_allow_evidence base)
set(assize_allow_sheet base field)
set(assize_allow_code base sheet field evidence)
set(assize_allow_bound base sheet field code evidence)
set(assize_allow_plan base sheet field code bound evidence)
set(assize_allow_kernel base)
set(assize_allow_engine base store sheet field code bound plan kernel evidence)
set(assize_allow_certificate base store sheet evidence)
set(assize_allow_recheck base)
set(assize_allow_report base sheet evidence bound certificate recheck)
set(assize_allow_api base store field evidence sheet code bound plan kernel engine certificate recheck report)
set(assize_allow_cli base api)

set(assize_rooms ${assize_allow_api} api cli)
