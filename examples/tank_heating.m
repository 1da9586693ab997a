% Warming a batch of paint in the jacketed tank: the electric heater of the
% water circuit, and how long a batch takes.

%% The tank
D_tank = 0.42;              % [m] inside diameter
h_fill = 0.44;              % [m] level of the paint
A_wall = pi*D_tank*h_fill;  % [m^2]
V_paint = pi/4*D_tank^2*h_fill;   % [m^3]

%% Paint and water
rho_p = 1240;               % [kg/m^3]
cp_p = 2300;                % [J/(kg K)]
U = 180;                    % [W/(m^2 K)]
T_start = 18;               % [degC]
T_goal = 45;                % [degC]
T_water = 62;               % [degC]

m = rho_p*V_paint;          % [kg]
tau = m*cp_p/(U*A_wall);    % [s] time constant
t_heat = -tau*log((T_water - T_goal)/(T_water - T_start));   % [s]
fprintf('%.0f kg of paint, %.1f min\n', m, t_heat/60);

%% Course of the temperature
t = linspace(0, t_heat, 60);                     % [s]
T = T_water - (T_water - T_start)*exp(-t/tau);   % [degC]
[T_end, last] = max(T);
rate = gradient(T, t);                           % [K/s]
hold on
plot(t/60, T); xlabel('t [min]'); ylabel('T [degC]');

%% Energy of the heater
[Q, E] = heater(m, cp_p, T_end - T_start, t(last));
fprintf('%.1f kW, %.2f kWh\n', Q/1000, E);
t_ramp = ramp_time(T_start, T_goal, 1.5);        % [min]

function [Q, E] = heater(mass, cp, dT, duration)
% HEATER  mean power and energy for a batch
%  INPUT:
%   mass      =  mass of the paint                   [ kg ]
%   cp        =  specific heat capacity              [ J/(kg K) ]
%   dT        =  rise of temperature                 [ K ]
%   duration  =  time of heating                     [ s ]
%  OUTPUT:
%   Q         =  mean power                          [ W ]
%   E         =  energy taken from the mains         [ kWh ]
  eta = 0.93;               % [-] losses of the circuit
  Q = mass*cp*dT/(eta*duration);
  E = Q*duration;
end

function t = ramp_time(T_1, T_2, slope)
% RAMP_TIME  time for a ramp of constant slope
%   T_1   - temperature at its beginning [degC]
%   T_2   - temperature at its end [degC]
%   slope - rise of temperature per time [K/min]
%   t     - time [min]
  if slope <= 0
    error('no rise');
  end
  t = (T_2 - T_1)*slope;
end
