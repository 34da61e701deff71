"""The relations of the trade, one module per family of the catalogue."""

from spec.relations import (
    a_pressure,
    b_simple,
    c_ideal,
    d_reference,
    e_mixtures,
    f_kinetic,
    g_real,
    h_humidity,
    j_flow,
    k_leak,
    l_purging,
    m_vessels,
    r_balances,
)

FAMILIES = (
    a_pressure.FAMILY,
    b_simple.FAMILY,
    c_ideal.FAMILY,
    d_reference.FAMILY,
    e_mixtures.FAMILY,
    f_kinetic.FAMILY,
    g_real.FAMILY,
    h_humidity.FAMILY,
    j_flow.FAMILY,
    k_leak.FAMILY,
    l_purging.FAMILY,
    m_vessels.FAMILY,
    r_balances.FAMILY,
)
