/** A script of our own with most of what the front end meets: small enough for every prefix of it to be parsed. */
export const script = `#= Settling tank, first sizing =#
module Tank
using Statistics: mean
import ..Walls as W, LinearAlgebra
include("parts.jl")
export settle

const g = 9.81       # [m/s^2]
Q = 0.35; ρₛ = 2_650.0  # 𝒳
sizes = [0.1,  # [mm] fine
         3f-1] .* 1e-3

"""
    settle(d; ν=1e-6)

Velocity after Stokes [m/s].

# Arguments
- \`d\`: grain size [m]
"""
function settle(d::T, ρ = ρₛ; ν::Float64 = 1e-6, kw...)::T where {T<:Real}
    # (quartz)

    if d < 1e-4 && ρ ≥ 998
        v = g*(ρ/998 - 1)*2d^2/18ν  # [m/s]
    elseif d > 1; return nothing
    else
        v = √(3.3g*d*(ρ/998 - 1)); s = "v = $(round(v)) \\$m/s"
    end
    for i in 1:3, j ∈ sizes
        v *= 1.0
    end
    v, [x^2 for x in sizes if x > 0]
end

Base.@kwdef mutable struct Basin{T} <: Any
    "clear width [m]"
    width::T = 4.0
    const depth::Float64  # [m]
end
area(b::Basin, x) = b.width*x'
(; width, depth) = Basin(depth = 3.2)
@inbounds @. sizes = sin(sizes) + 1
A = try
    Q/settle(sizes[end])[1]
catch e
    missing
end
map(sizes) do x
    x > 0 ? 2x : -x
end
x = 1
y = [1 -2; 3 4]
x = 1
end
`;
